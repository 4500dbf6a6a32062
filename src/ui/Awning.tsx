import { useId } from "react";
import { awningTile, canopyPath, pinPaths, type AwningDrawing } from "../../shared/domain/look/awning.ts";
import { Shapes } from "./Shapes.tsx";

type Props = AwningDrawing & {
  /** In CSS pixels. */
  height?: number | undefined;
  /** Black line work, for paper. */
  mono?: boolean | undefined;
  className?: string | undefined;
};

/** A market's awning across the whole width it is given, scalloped along its lower edge. Decoration: the name stands beside it. */
export function Awning({ pattern, colour, height = 18, mono = false, className = "" }: Props) {
  const id = useId();
  const [cloth, print] = awningTile({ pattern, colour }, mono);
  return (
    <svg width="100%" height={height} className={`block ${className}`} aria-hidden="true">
      <defs>
        <pattern id={`${id}cloth`} width="28" height="28" patternUnits="userSpaceOnUse">
          <Shapes shapes={[cloth!, print!]} />
        </pattern>
        <pattern id={`${id}canopy`} width="28" height={height} patternUnits="userSpaceOnUse">
          <path d={canopyPath(height)} fill={`url(#${id}cloth)`} stroke={print!.colour} strokeWidth="1.5" />
        </pattern>
      </defs>
      <rect width="100%" height={height} fill={`url(#${id}canopy)`} />
    </svg>
  );
}

/** A market's mark for lists and legends: a little stall under its awning. */
export function AwningPin({ pattern, colour, mono = false, className = "h-13 w-11" }: Omit<Props, "height">) {
  const id = useId();
  const [width, height] = pinPaths.size;
  return (
    <svg
      viewBox={`0 0 ${width} ${height}`}
      className={`shrink-0 ${className}`}
      aria-hidden="true"
      stroke="#10201C"
      strokeWidth="2"
      strokeLinejoin="round"
    >
      <defs>
        <pattern id={id} width="28" height="28" x="8" y="-2" patternUnits="userSpaceOnUse">
          <Shapes shapes={awningTile({ pattern, colour }, mono)} />
        </pattern>
      </defs>
      <path d={pinPaths.stall} fill="#FFFFFF" />
      <path d={pinPaths.canopy} fill={`url(#${id})`} />
    </svg>
  );
}
