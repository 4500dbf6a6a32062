import { z } from "zod";

/** The closed list of market patterns; each is told from the others in black and white too. */
export const awningPatterns = [
  "wide",
  "narrow",
  "diagonal",
  "dots",
  "checks",
  "chevron",
  "scales",
  "zigzag",
  "lines",
  "diamonds",
] as const;

/** The closed list of colour pairs: the print and the cloth it is on. */
export const awningColours = {
  sun: ["#F4C534", "#FFFFFF"],
  radicchio: ["#8A1C44", "#FFFFFF"],
  deep: ["#0F4C52", "#D6E9E6"],
  leaf: ["#4C7A1E", "#E3EFCF"],
  ink: ["#10201C", "#FFFFFF"],
  rose: ["#8A1C44", "#F6E1E8"],
  marigold: ["#8A1C44", "#F4C534"],
  dusk: ["#10201C", "#F4C534"],
  pond: ["#0F4C52", "#FBE9A9"],
  moss: ["#2F5210", "#B7DB7A"],
} as const satisfies Record<string, readonly [string, string]>;

export type AwningPattern = (typeof awningPatterns)[number];
export type AwningColour = keyof typeof awningColours;

/** A market's awning: a pattern and a colour, never a colour alone. */
export const awningSchema = z.object({
  pattern: z.enum(awningPatterns),
  colour: z.enum(Object.keys(awningColours) as [AwningColour, ...AwningColour[]]),
});
export type AwningDrawing = z.infer<typeof awningSchema>;

/** The side of the square that every pattern repeats by, in SVG units. */
export const awningTileSize = 28;

const small = [0, 14].flatMap((x) => [0, 14].map((y) => [x, y] as const));
const four = (motif: string) => small.map(([x, y]) => `M${x} ${y}${motif}`).join("");

/** Each pattern as one path in the 28 by 28 tile; `width` makes it a line instead of a fill. */
const motifs: Record<AwningPattern, { d: string; width?: number }> = {
  wide: { d: "M0 0h14v28H0Z" },
  narrow: { d: "M0 0h3.5v28H0ZM7 0h3.5v28H7ZM14 0h3.5v28H14ZM21 0h3.5v28H21Z" },
  diagonal: { d: [-28, -14, 0, 14].map((x) => `M${x} 28l28-28h7l-28 28Z`).join("") },
  dots: { d: four("m3 7a4 4 0 1 0 8 0a4 4 0 1 0-8 0Z") },
  checks: { d: four("h7v7h-7Zm7 7h7v7h-7Z") },
  chevron: { d: four("l7 7 7-7v6l-7 7-7-7Z") },
  scales: {
    d: "M0 0a7 7 0 0 0 14 0a7 7 0 0 0 14 0M-7 7a7 7 0 0 0 14 0a7 7 0 0 0 14 0a7 7 0 0 0 14 0M0 14a7 7 0 0 0 14 0a7 7 0 0 0 14 0M-7 21a7 7 0 0 0 14 0a7 7 0 0 0 14 0a7 7 0 0 0 14 0",
    width: 2,
  },
  zigzag: {
    d: "M-1 9l4.5-6L7 9l3.5-6L14 9l3.5-6L21 9l3.5-6L29 9M-1 23l4.5-6L7 23l3.5-6 3.5 6 3.5-6 3.5 6 3.5-6 4.5 6",
    width: 1.8,
  },
  lines: { d: "M0 3.5h28M0 8h28M0 17.5h28M0 22h28", width: 2.4 },
  diamonds: { d: four("m7 0l7 7-7 7-7-7Z") },
};

/** One repeat of an awning: the cloth and the print on it, a fill or (with `width`) lines. */
export type AwningTile = { cloth: string; print: string; d: string; width?: number };

/** What to draw an awning with; `mono` gives black line work for paper. */
export function awningTile({ pattern, colour }: AwningDrawing, mono = false): AwningTile {
  const [print, cloth] = mono ? ["#000000", "#FFFFFF"] : awningColours[colour];
  return { cloth, print, ...motifs[pattern] };
}

/** One repeat of the canopy: the cloth, and the lower edge of two scallops that hangs from a real awning. */
export function canopyPaths(height: number): { cloth: string; edge: string } {
  const drop = Math.min(5, height / 3);
  const scallops = `a7 ${drop} 0 0 1-14 0a7 ${drop} 0 0 1-14 0`;
  const edgeY = height - drop - 1;
  return { cloth: `M0 0H28V${edgeY}${scallops}Z`, edge: `M28 ${edgeY}${scallops}` };
}

/** A market's mark on the map, 44 by 52 with its point at (22, 50): a stall under its awning. */
export const pin = {
  outline: "#10201C",
  wall: "#FFFFFF",
  size: [44, 52],
  canopy: "M8 3H36L42 21a5 5 0 0 1-10 0a5 5 0 0 1-10 0a5 5 0 0 1-10 0a5 5 0 0 1-10 0Z",
  stall: "M6 20V35a3 3 0 0 0 3 3H17L22 50 27 38H35a3 3 0 0 0 3-3V20Z",
} as const;

/** The map mark as SVG markup, for a map library that takes a string; `id` must be unlike any other on the page. */
export function awningPinMarkup(awning: AwningDrawing, id: string): string {
  const { cloth, print, d, width } = awningTile(awning);
  const motif = width
    ? `<path d="${d}" fill="none" stroke="${print}" stroke-width="${width}"/>`
    : `<path d="${d}" fill="${print}"/>`;
  return (
    `<svg width="44" height="52" viewBox="0 0 44 52" aria-hidden="true" stroke="${pin.outline}" stroke-width="2" stroke-linejoin="round">` +
    `<defs><pattern id="${id}" width="28" height="28" x="8" y="-2" patternUnits="userSpaceOnUse"><g stroke="none"><path d="M0 0h28v28H0Z" fill="${cloth}"/>${motif}</g></pattern></defs>` +
    `<path d="${pin.stall}" fill="${pin.wall}"/><path d="${pin.canopy}" fill="url(#${id})"/></svg>`
  );
}
