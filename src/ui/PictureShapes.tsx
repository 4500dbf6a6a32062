import type { Picture } from "../../shared/domain/look/plantDrawing.ts";
import { edgeWidth } from "../../shared/domain/look/svgMarkup.ts";

/** A drawn picture as an SVG group; the text form is pictureMarkup. */
export function PictureShapes({ picture: { line, shapes } }: { picture: Picture }) {
  return (
    <g fill="none" stroke={line} strokeWidth={edgeWidth} strokeLinecap="round" strokeLinejoin="round">
      {shapes.map(({ d, fill, stroke, width }, index) => (
        <path key={index} d={d} fill={fill} stroke={stroke} strokeWidth={width} />
      ))}
    </g>
  );
}
