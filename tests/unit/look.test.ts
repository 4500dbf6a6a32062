import fc from "fast-check";
import { createElement } from "react";
import { renderToString } from "react-dom/server";
import sharp from "sharp";
import { describe, expect, test } from "vitest";
import {
  awningColours,
  awningPatterns,
  awningPinMarkup,
  awningSchema,
  awningTile,
  type AwningColour,
} from "../../shared/domain/look/awning.ts";
import { drawPlant } from "../../shared/domain/look/drawPlant.ts";
import { drawRoots } from "../../shared/domain/look/drawRoots.ts";
import { plantDrawingSchema, type PlantDrawing } from "../../shared/domain/look/plantDrawing.ts";
import { pictureMarkup } from "../../shared/domain/look/svgMarkup.ts";
import { varietyDrawings } from "../../shared/domain/look/varietyDrawings.ts";
import { Plant } from "../../src/ui/Plant.tsx";
import { Roots } from "../../src/ui/Roots.tsx";

const colours = Object.keys(awningColours) as AwningColour[];

describe("plants", () => {
  test("there are twenty-four varieties, each with its own slug, name and numbers within bounds", () => {
    expect(varietyDrawings).toHaveLength(24);
    expect(new Set(varietyDrawings.map((variety) => variety.slug)).size).toBe(24);
    expect(new Set(varietyDrawings.map((variety) => variety.name)).size).toBe(24);
    for (const { drawing } of varietyDrawings) expect(plantDrawingSchema.parse(drawing)).toEqual(drawing);
  });

  test.each(varietyDrawings)("$name takes less than 6 kB of markup, roots apart", ({ slug, drawing }) => {
    const markup = renderToString(createElement(Plant, { slug, drawing, className: "mx-auto block w-11/12" }));
    expect(Buffer.byteLength(markup)).toBeLessThan(6_000);
    expect(markup).not.toMatch(/NaN|Infinity|style=/);
  });

  test("the same slug and numbers always give the same leaves, another slug gives others", () => {
    for (const { slug, drawing } of varietyDrawings) {
      expect(drawPlant(slug, drawing)).toEqual(drawPlant(slug, structuredClone(drawing)));
      expect(pictureMarkup(drawPlant(slug, drawing))).not.toBe(pictureMarkup(drawPlant(`${slug} too`, drawing)));
    }
  });

  test("no two varieties look alike", () => {
    const pictures = varietyDrawings.map(({ drawing }) => pictureMarkup(drawPlant("one seed", drawing)));
    expect(new Set(pictures).size).toBe(24);
  });

  test("wherever the owner leaves the sliders, a plant can be drawn", () => {
    fc.assert(
      fc.property(anyDrawing, fc.string(), (drawing, slug) => {
        const { shapes } = drawPlant(slug, plantDrawingSchema.parse(drawing));
        expect(shapes.length).toBeGreaterThan(2);
        for (const shape of shapes) expect(shape.d).toMatch(/^M[-\dMcqslhvZ .]+$/);
      }),
      { numRuns: 300 },
    );
  });

  test("numbers out of bounds and colours in words are refused", () => {
    const { drawing } = varietyDrawings[0]!;
    expect(plantDrawingSchema.safeParse({ ...drawing, leaves: 400 }).success).toBe(false);
    expect(plantDrawingSchema.safeParse({ ...drawing, leafLength: 50.5 }).success).toBe(false);
    expect(plantDrawingSchema.safeParse({ ...drawing, veinColour: "red" }).success).toBe(false);
    expect(plantDrawingSchema.safeParse({ ...drawing, habit: "tree" }).success).toBe(false);
  });
});

describe("roots", () => {
  const ends = (slug: string, days: number) =>
    drawRoots(slug, days).shapes.flatMap(({ d }) =>
      d
        .split("M")
        .slice(1)
        .map((root) => Number(root.split(" ").at(-1))),
    );
  const sum = (numbers: number[]) => numbers.reduce((total, number) => total + number, 0);

  test("an older plant never has fewer or shorter roots than a younger one", () => {
    const days = fc.integer({ min: 0, max: 90 });
    fc.assert(
      fc.property(fc.string(), days, days, (slug, a, b) => {
        const young = ends(slug, Math.min(a, b));
        const old = ends(slug, Math.max(a, b));
        expect(old.length).toBeGreaterThanOrEqual(young.length);
        expect(sum(old)).toBeGreaterThanOrEqual(sum(young));
        expect(Math.max(...old)).toBeLessThanOrEqual(150);
      }),
    );
  });

  test("five weeks show against one week: more roots, at least twice as deep", () => {
    for (const { slug } of varietyDrawings) {
      expect(ends(slug, 35).length).toBeGreaterThan(ends(slug, 7).length + 5);
      expect(Math.max(...ends(slug, 35))).toBeGreaterThan(2 * Math.max(...ends(slug, 7)));
    }
  });

  test("roots take less than 2 kB of markup", () => {
    expect(Buffer.byteLength(renderToString(createElement(Roots, { slug: "butterhead", days: 60 })))).toBeLessThan(
      2_000,
    );
  });
});

describe("awnings", () => {
  test("there are ten patterns and ten colours, and nothing else is an awning", () => {
    expect(awningPatterns).toHaveLength(10);
    expect(colours).toHaveLength(10);
    expect(awningSchema.safeParse({ pattern: "dots", colour: "leaf" }).success).toBe(true);
    expect(awningSchema.safeParse({ pattern: "paisley", colour: "leaf" }).success).toBe(false);
    expect(awningSchema.safeParse({ pattern: "dots", colour: "#4C7A1E" }).success).toBe(false);
  });

  test("any two patterns differ in black and white over at least a tenth of the cloth", async () => {
    const cloths = await Promise.all(awningPatterns.map((pattern) => monoPixels(pattern)));
    for (const [i, one] of cloths.entries()) {
      for (const [j, other] of cloths.entries()) {
        if (i < j) expect(differing(one, other), `${awningPatterns[i]} and ${awningPatterns[j]}`).toBeGreaterThan(0.1);
      }
    }
  });

  test("a map mark carries its own pattern under the id it was given", () => {
    const markup = awningPinMarkup({ pattern: "checks", colour: "radicchio" }, "market-7");
    expect(markup).toContain('<pattern id="market-7"');
    expect(markup).toContain('fill="url(#market-7)"');
    expect(markup).not.toContain("style=");
  });
});

async function monoPixels(pattern: (typeof awningPatterns)[number]): Promise<Buffer> {
  const { cloth, print, d, width } = awningTile({ pattern, colour: "sun" }, true);
  const ink = width ? `fill="none" stroke="${print}" stroke-width="${width}"` : `fill="${print}"`;
  const svg = `<svg xmlns="http://www.w3.org/2000/svg" width="56" height="56" viewBox="0 0 28 28"><rect width="28" height="28" fill="${cloth}"/><path d="${d}" ${ink}/></svg>`;
  return sharp(Buffer.from(svg)).greyscale().raw().toBuffer();
}

function differing(one: Buffer, other: Buffer): number {
  const count = one.reduce((total, value, at) => total + (Math.abs(value - other[at]!) > 127 ? 1 : 0), 0);
  return count / one.length;
}

const percentFrom = (min: number, max = 100) => fc.integer({ min, max });
const anyColour = fc.integer({ min: 0, max: 0xffffff }).map((value) => `#${value.toString(16).padStart(6, "0")}`);
const anyDrawing: fc.Arbitrary<PlantDrawing> = fc.record({
  habit: fc.constantFrom("head", "rosette", "sprig", "stalk"),
  leaf: fc.constantFrom("blade", "hand", "thread", "tube"),
  leafLength: percentFrom(15),
  leafWidth: percentFrom(2),
  shoulder: percentFrom(15, 90),
  roundness: percentFrom(0),
  lobe: percentFrom(0),
  lobes: percentFrom(0, 7),
  frill: percentFrom(0),
  leaves: percentFrom(3, 30),
  spread: percentFrom(0),
  rib: percentFrom(0),
  colours: fc.tuple(anyColour, anyColour, anyColour),
  veinColour: anyColour,
});
