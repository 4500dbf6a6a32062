import { bentLine, bowedOutline, polyline, smoothOutline, type Point } from "./curve.ts";

/** Where a leaf or stem starts, points (degrees from upright, right is positive), and how far it arches over its length. */
export type Spine = { x: number; y: number; angle: number; bend: number; length: number };

/** One leaf to draw; `halfWidth` in SVG units, the rest as shares from 0 to 1. */
export type LeafSpec = Spine & {
  halfWidth: number;
  shoulder: number;
  roundness: number;
  lobe: number;
  lobes: number;
  frill: number;
};

const radians = (degrees: number) => (degrees * Math.PI) / 180;

/** The point at share `t` of a curved midrib, moved `aside` units to the right of it. */
export function alongSpine(spine: Spine, t: number, aside = 0): Point {
  const start = radians(spine.angle);
  const bend = radians(spine.bend) || 1e-4;
  const here = start + bend * t;
  const reach = spine.length / bend;
  return {
    x: spine.x + reach * (Math.cos(start) - Math.cos(here)) + aside * Math.cos(here),
    y: spine.y - reach * (Math.sin(here) - Math.sin(start)) + aside * Math.sin(here),
  };
}

/** A stretch of the midrib as one bent line. */
export function spineLine(spine: Spine, from: number, to: number): string {
  const a = alongSpine(spine, from);
  const b = alongSpine(spine, to);
  const middle = alongSpine(spine, (from + to) / 2);
  return bentLine(a, { x: 2 * middle.x - (a.x + b.x) / 2, y: 2 * middle.y - (a.y + b.y) / 2 }, b);
}

/** Half the width of the plain blade at share `t` of its length; no tip is blunter than an ellipse's. */
function profile({ halfWidth, shoulder, roundness }: LeafSpec, t: number): number {
  const k = 2.4 - 1.9 * roundness;
  const toBase = k * shoulder;
  const toTip = Math.max(0.44, k * (1 - shoulder));
  const widest = toBase / (toBase + toTip);
  return halfWidth * (t / widest) ** toBase * ((1 - t) / (1 - widest)) ** toTip;
}

/** The blade's outline as a path, clockwise from its base; short leaves are drawn through fewer points. */
export function leafOutline(leaf: LeafSpec, random: () => number): string {
  if (leaf.frill >= 0.25) return frilledOutline(leaf, random);
  const lobed = leaf.lobes > 0 && leaf.lobe > 0;
  const steps = lobed ? lobeSteps(leaf) : leaf.halfWidth < 16 ? fewSteps : leaf.length > 170 ? longSteps : shortSteps;
  const side = (sign: number): Point[] =>
    steps.map(({ t, cut }) => {
      const wave = 1 + (random() - 0.5) * (0.05 + leaf.frill);
      const corner = lobed && cut === 0 && leaf.roundness < 0.3;
      return { ...alongSpine(leaf, t, sign * profile(leaf, t) * (1 - cut) * wave), corner };
    });
  const tip = { ...alongSpine(leaf, 1), corner: leaf.roundness < 0.55 };
  const base = { ...alongSpine(leaf, 0), corner: true };
  return smoothOutline([base, ...side(-1), tip, ...side(1).reverse()]);
}

const plain = (t: number) => ({ t, cut: 0 });
const longSteps = [0.06, 0.24, 0.46, 0.68, 0.86, 0.96].map(plain);
const shortSteps = [0.1, 0.36, 0.66, 0.92].map(plain);
const fewSteps = [0.16, 0.5, 0.84].map(plain);

/** Bays and lobes by turns; a lobe leans toward the tip, so it comes late in its pitch. */
function lobeSteps({ lobe, lobes }: LeafSpec) {
  const pitch = 0.84 / (lobes + 0.45);
  const steps = [];
  for (let i = 0; i < lobes; i++) {
    const bay = 0.12 + pitch * i;
    steps.push({ t: bay, cut: lobe }, plain(bay + pitch * 0.6));
  }
  return [...steps, { t: 0.12 + pitch * lobes, cut: lobe * 0.8 }, { t: 0.93, cut: 0.12 }];
}

function frilledOutline(leaf: LeafSpec, random: () => number): string {
  const bows = 2 + Math.round(leaf.length / 33);
  const side = (sign: number) =>
    Array.from({ length: bows }, (_, i) => {
      const t = Math.min(0.985, 0.12 + (0.88 * (i + 0.7 * random())) / bows);
      return alongSpine(leaf, t, sign * profile(leaf, t) * (1 - leaf.frill * 0.3 * random()));
    });
  const points = [alongSpine(leaf, 0), ...side(-1), alongSpine(leaf, 0.99), ...side(1).reverse()];
  const smooth = new Set([0, points.length - 1]);
  return bowedOutline(points, (i) => (smooth.has(i) ? 0.05 : leaf.frill * (0.4 + 0.5 * random())));
}

/** Midrib and pairs of side veins as one line; each pair is a V that opens toward the tip. */
export function leafVeins(leaf: LeafSpec, pairs: number): string {
  let d = spineLine(leaf, 0.02, 0.86);
  for (let i = 1; i <= pairs; i++) {
    const from = 0.08 + (0.62 * i) / (pairs + 0.5);
    const to = Math.min(0.92, from + 0.16);
    const reach = profile(leaf, to) * (1 - leaf.lobe * 0.6) * 0.72;
    d += polyline(alongSpine(leaf, to, -reach), alongSpine(leaf, from), alongSpine(leaf, to, reach));
  }
  return d;
}

/** A feathery frond: threads in pairs along its midline, each ending in a fork. */
export function threadFrond(leaf: LeafSpec): string {
  let d = spineLine(leaf, 0, 1);
  for (let i = 0; i < leaf.lobes; i++) {
    const t = 0.22 + (0.7 * i) / leaf.lobes;
    const reach = profile(leaf, t) + leaf.halfWidth * 0.2;
    const at = (further: number, aside: number) => alongSpine(leaf, t + further, aside * reach);
    const [left, right] = [at(0.12, -0.5), at(0.12, 0.5)];
    d += polyline(at(0.13, -1), left, at(0, 0), right, at(0.13, 1));
    d += polyline(left, at(0.32, -0.75)) + polyline(right, at(0.32, 0.75));
  }
  return d;
}
