import { drawRoots, rootsViewBox } from "../../shared/domain/look/drawRoots.ts";
import { PictureShapes } from "./PictureShapes.tsx";

type Props = {
  slug: string;
  /** Days since sowing: older plants have more and longer roots. */ days: number;
  className?: string | undefined;
};

/** Roots hanging from the upper edge of their box; stands right under a Plant of the same width. */
export function Roots({ slug, days, className }: Props) {
  return (
    <svg viewBox={rootsViewBox} className={className} aria-hidden="true">
      <PictureShapes picture={drawRoots(slug, days)} />
    </svg>
  );
}
