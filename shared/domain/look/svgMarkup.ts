import type { Picture, Shape } from "./plantDrawing.ts";

/** The width of edges and veins, in SVG units. */
export const edgeWidth = 1.6;

/** A picture as an SVG group, for pages and mails that are written as text. */
export function pictureMarkup({ line, shapes }: Picture): string {
  return (
    `<g fill="none" stroke="${line}" stroke-width="${edgeWidth}" stroke-linecap="round" stroke-linejoin="round">` +
    `${shapes.map(pathMarkup).join("")}</g>`
  );
}

function pathMarkup({ d, fill, stroke, width }: Shape): string {
  const attributes = Object.entries({ d, fill, stroke, "stroke-width": width });
  return `<path ${attributes.flatMap(([name, value]) => (value === undefined ? [] : `${name}="${value}"`)).join(" ")}/>`;
}
