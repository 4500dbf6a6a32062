import { drawPlant, plantViewBox } from "../../shared/domain/look/drawPlant.ts";
import type { PlantDrawing } from "../../shared/domain/look/plantDrawing.ts";
import { PictureShapes } from "./PictureShapes.tsx";

type Props = {
  slug: string;
  drawing: PlantDrawing;
  /** Words for those who cannot see it; leave out where the name stands beside it. */
  label?: string | undefined;
  className?: string | undefined;
};

/** A variety's leaves, standing on the lower edge of its box. */
export function Plant({ slug, drawing, label, className }: Props) {
  return (
    <svg
      viewBox={plantViewBox}
      className={className}
      role={label ? "img" : undefined}
      aria-label={label}
      aria-hidden={label ? undefined : true}
    >
      <PictureShapes picture={drawPlant(slug, drawing)} />
    </svg>
  );
}

/** The same drawing as a small square mark, for lists, tables and pickers. */
export function PlantMark({ slug, drawing, className = "size-9" }: Omit<Props, "label">) {
  return (
    <svg viewBox="-310 -480 620 620" className={`shrink-0 ${className}`} aria-hidden="true">
      <PictureShapes picture={drawPlant(slug, drawing)} />
    </svg>
  );
}
