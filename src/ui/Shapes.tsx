import type { Shape } from "../../shared/domain/look/plantDrawing.ts";

/** Draws shape data as SVG paths; `outlined` gives fills the faint edge that parts leaf from leaf. */
export function Shapes({ shapes, outlined }: { shapes: Shape[]; outlined?: boolean | undefined }) {
  return (
    <g
      strokeLinecap="round"
      strokeLinejoin="round"
      stroke={outlined ? "#10201C" : "none"}
      strokeOpacity={outlined ? 0.2 : 1}
      strokeWidth="2"
    >
      {shapes.map(({ d, colour, width }, index) =>
        width ? (
          <path key={index} d={d} fill="none" stroke={colour} strokeWidth={width} strokeOpacity={1} />
        ) : (
          <path key={index} d={d} fill={colour} />
        ),
      )}
    </g>
  );
}
