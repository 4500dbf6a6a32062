import { bentLine, bowedOutline, smoothOutline, type Point } from "./curve.ts";

/** One leaf to draw: where it starts, where it points (degrees from upright, right is positive), how it arches. */
export type LeafSpec = {
  x: number;
  y: number;
  angle: number;
  bend: number;
  length: number;
  /** Half the leaf's greatest width, in SVG units. */
  halfWidth: number;
  /** The rest as shares from 0 to 1. */
  shoulder: number;
  roundness: number;
  lobe: number;
  lobes: number;
  frill: number;
};

const radians = (degrees: number) => (degrees * Math.PI) / 180;

/** The point at share `t` of a leaf's curved midrib, moved `aside` units to the right of it. */
export function alongSpine(leaf: Pick<LeafSpec, "x" | "y" | "angle" | "bend" | "length">, t: number, aside = 0): Point {
  const start = radians(leaf.angle),
    bend = radians(leaf.bend) || 1e-4,
    here = start + bend * t;
  const reach = leaf.length / bend;
  return {
    x: leaf.x + reach * (Math.cos(start) - Math.cos(here)) + aside * Math.cos(here),
    y: leaf.y - reach * (Math.sin(here) - Math.sin(start)) + aside * Math.sin(here),
  };
}

/** Half the width of the plain blade at share `t` of its length. */
function profile({ halfWidth, shoulder, roundness }: LeafSpec, t: number): number {
  const k = 2.4 - 1.9 * roundness;
  return halfWidth * (t / shoulder) ** (k * shoulder) * ((1 - t) / (1 - shoulder)) ** (k * (1 - shoulder));
}

/** The blade's outline as a path, clockwise from its base. */
export function leafOutline(leaf: LeafSpec, random: () => number): string {
  if (leaf.frill >= 0.25) return frilledOutline(leaf, random);
  const steps = leaf.lobes > 0 && leaf.lobe > 0 ? lobeSteps(leaf) : plainSteps;
  const wave = () => 1 + (random() - 0.5) * (0.05 + leaf.frill);
  const side = (sign: number): Point[] =>
    steps.map(({ t, cut }) => alongSpine(leaf, t, sign * profile(leaf, t) * (1 - cut) * wave()));
  const tip = { ...alongSpine(leaf, 1), corner: leaf.roundness < 0.55 };
  const base = { ...alongSpine(leaf, 0), corner: true };
  return smoothOutline([base, ...side(-1), tip, ...side(1).reverse()]);
}

const plainSteps = [0.05, 0.18, 0.36, 0.56, 0.75, 0.9, 0.97].map((t) => ({ t, cut: 0 }));

function lobeSteps({ lobe, lobes }: LeafSpec) {
  const steps = [{ t: 0.04, cut: 0.2 }];
  const pitch = 0.86 / (lobes + 0.5);
  for (let i = 0; i < lobes; i++) {
    const valley = 0.1 + pitch * i;
    steps.push({ t: valley, cut: lobe }, { t: valley + pitch * 0.62, cut: 0 });
  }
  const last = 0.1 + pitch * lobes;
  return [...steps, { t: last, cut: lobe * 0.6 }, { t: 0.97, cut: 0 }];
}

function frilledOutline(leaf: LeafSpec, random: () => number): string {
  const bows = 7 + Math.round(leaf.length / 55);
  const side = (sign: number) =>
    Array.from({ length: bows }, (_, i) => {
      const t = Math.min(0.985, 0.1 + (0.9 * (i + 0.6 * random())) / bows);
      const lobe = leaf.lobes > 0 ? leaf.lobe * (0.5 + 0.5 * Math.cos(2 * Math.PI * t * leaf.lobes)) : 0;
      return alongSpine(leaf, t, sign * profile(leaf, t) * (1 - lobe) * (1 - leaf.frill * 0.3 * random()));
    });
  const points = [alongSpine(leaf, 0), ...side(-1), alongSpine(leaf, 0.99), ...side(1).reverse()];
  const smooth = new Set([0, points.length - 1]);
  return bowedOutline(points, (i) => (smooth.has(i) ? 0.05 : leaf.frill * (0.45 + 0.5 * random())));
}

/** The midrib as a thin wedge, and the side veins as one line. */
export function leafVeins(leaf: LeafSpec, veins: number): { rib: string; veins: string } {
  const reach = 0.88;
  let lines = bentLine(alongSpine(leaf, 0.02), spineHandle(leaf, 0, reach), alongSpine(leaf, reach));
  const rib = lines;
  lines = "";
  for (let i = 1; i <= veins; i++) {
    const from = 0.1 + (0.62 * i) / (veins + 0.5),
      to = Math.min(0.93, from + 0.17);
    for (const sign of [-1, 1]) {
      const out = profile(leaf, to) * (1 - leaf.lobe * 0.6) * 0.72;
      lines += bentLine(
        alongSpine(leaf, from),
        alongSpine(leaf, from + 0.08, sign * out * 0.4),
        alongSpine(leaf, to, sign * out),
      );
    }
  }
  return { rib, veins: lines };
}

function spineHandle(leaf: LeafSpec, from: number, to: number): Point {
  const a = alongSpine(leaf, from),
    b = alongSpine(leaf, to),
    m = alongSpine(leaf, (from + to) / 2);
  return { x: 2 * m.x - (a.x + b.x) / 2, y: 2 * m.y - (a.y + b.y) / 2 };
}
