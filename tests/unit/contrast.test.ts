import { readFileSync } from "node:fs";
import { describe, expect, test } from "vitest";

const css = readFileSync(new URL("../../src/app/styles.css", import.meta.url), "utf8");

/** The tokens as the style sheet states them for the screen: light-dark(day, night), or one colour for both. */
const tokens = new Map(
  [...css.split("@media print")[0]!.matchAll(/--([\w-]+): (?:light-dark\((#\w{6}), (#\w{6})\)|(#\w{6}));/g)].map(
    ([, name, day, night, both]) => [name!, { day: day ?? both!, night: night ?? both! }] as const,
  ),
);

/** Relative luminance and contrast ratio of WCAG 2.2, https://www.w3.org/TR/WCAG22/#dfn-relative-luminance */
function luminance(colour: string): number {
  const [r, g, b] = [1, 3, 5].map((at) => {
    const share = parseInt(colour.slice(at, at + 2), 16) / 255;
    return share <= 0.04045 ? share / 12.92 : ((share + 0.055) / 1.055) ** 2.4;
  }) as [number, number, number];
  return 0.2126 * r + 0.7152 * g + 0.0722 * b;
}

function contrast(one: string, other: string): number {
  const [dark, light] = [luminance(one), luminance(other)].sort((a, b) => a - b) as [number, number];
  return (light + 0.05) / (dark + 0.05);
}

const surfaces = ["mist", "float", "water"];
const words: [string, string[]][] = [
  ["ink", [...surfaces, "leaf-soft", "radicchio-soft"]],
  ["ink-2", surfaces],
  ["water-deep", surfaces],
  ["leaf-ink", [...surfaces, "leaf-soft"]],
  ["radicchio", [...surfaces, "radicchio-soft"]],
  ["alarm", surfaces],
  ["awning-ink", ["awning", "awning-soft"]],
  ["on-primary", ["water-deep", "alarm", "leaf", "radicchio"]],
  ["mist", ["ink"]],
];
const controls: [string, string[]][] = [
  ["ink-2", surfaces],
  ["water-deep", surfaces],
  ["focus", surfaces],
  ["leaf", surfaces],
  ["radicchio", surfaces],
  ["alarm", surfaces],
];

function pairs(list: [string, string[]][]) {
  return (["day", "night"] as const).flatMap((theme) =>
    list.flatMap(([front, grounds]) => grounds.map((ground) => ({ theme, front, ground }))),
  );
}

function ratio(theme: "day" | "night", front: string, ground: string): number {
  return contrast(tokens.get(front)![theme], tokens.get(ground)![theme]);
}

describe("contrast", () => {
  test("the measure agrees with published pairs", () => {
    // https://www.w3.org/WAI/WCAG22/Understanding/contrast-minimum.html: black on white is 21:1;
    // https://webaim.org/articles/contrast/: #767676 on white is 4.54:1.
    expect(contrast("#000000", "#FFFFFF")).toBe(21);
    expect(contrast("#767676", "#FFFFFF")).toBeCloseTo(4.54, 2);
  });

  test.each(pairs(words))("words in $front can be read on $ground by $theme", ({ theme, front, ground }) => {
    expect(ratio(theme, front, ground)).toBeGreaterThanOrEqual(4.5);
  });

  test.each(pairs(controls))(
    "a control or mark in $front stands out from $ground by $theme",
    ({ theme, front, ground }) => {
      expect(ratio(theme, front, ground)).toBeGreaterThanOrEqual(3);
    },
  );
});
