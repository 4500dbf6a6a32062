import { alongSpine, leafOutline, leafVeins, spineLine, threadFrond, type LeafSpec, type Spine } from "./leaf.ts";
import type { PlantDrawing, Shape } from "./plantDrawing.ts";
import { tint } from "./tint.ts";

/** What the habits draw with: the variety's numbers and its own stream of chance. */
export type Brush = { drawing: PlantDrawing; random: () => number };

/** Where one leaf goes; `size` is a share of the variety's leaf length. */
type Placing = { x?: number; y?: number; angle: number; bend?: number; size: number; fill: string; wide?: number };

/** The height a leaf of 100 % has when it stands upright, in SVG units. */
const roomAbove = 385;

const upTo = (count: number) => Array.from({ length: count }, (_, index) => index);
const alternate = (index: number) => (index % 2 ? 1 : -1);
const tone = ({ colours }: PlantDrawing, rank: number) => colours[rank < 0.36 ? 0 : rank < 0.72 ? 1 : 2];

function specFor({ drawing }: Brush, { x = 0, y = 0, angle, bend = 0, size, wide = 1 }: Placing): LeafSpec {
  const length = (roomAbove * drawing.leafLength * size) / 100;
  return {
    x,
    y,
    angle,
    bend,
    length,
    halfWidth: (length * drawing.leafWidth * wide) / 200,
    shoulder: drawing.shoulder / 100,
    roundness: drawing.roundness / 100,
    lobe: drawing.lobe / 100,
    lobes: drawing.lobes,
    frill: drawing.frill / 100,
  };
}

/** A filled outline with an edge of its own colour, darker; no two neighbours are quite alike. */
function filled({ random }: Brush, d: string, fill: string): Shape {
  const own = tint(fill, (random() - 0.5) * 0.14);
  return { d, fill: own, stroke: tint(own, -0.22) };
}

/** A blade, its veins, and a thick midrib where the variety has one. */
function bladeShapes(brush: Brush, placing: Placing, veinPairs: number): Shape[] {
  const leaf = specFor(brush, placing);
  const shapes: Shape[] = [
    filled(brush, leafOutline(leaf, brush.random), placing.fill),
    { d: leafVeins(leaf, veinPairs) },
  ];
  const rib = (brush.drawing.rib * leaf.length) / 4000;
  return rib < 2.4 ? shapes : [...shapes, { d: spineLine(leaf, 0, 0.55), width: Math.round(rib) }];
}

/** Leaves wrapped about a heart: dark open ones behind, the heart pale, short ones cupping it in front. */
export function headShapes(brush: Brush): Shape[] {
  const { drawing, random } = brush;
  const open = 16 + drawing.spread * 0.66;
  const frontCount = Math.round(drawing.leaves * 0.3);
  const backCount = drawing.leaves - frontCount;
  const back = upTo(backCount).flatMap((i) => {
    const inward = i / (backCount - 1);
    const side = alternate(i);
    const angle = side * (1 - inward) * open * (0.86 + 0.24 * random());
    const size = (0.84 + 0.12 * Math.min(1, inward * 2) + 0.08 * random()) * (1 - 0.2 * Math.max(0, inward - 0.5));
    return bladeShapes(
      brush,
      { x: angle * 0.25, angle, bend: angle * 0.34, size, fill: tone(drawing, inward) },
      drawing.frill < 60 ? 3 : 2,
    );
  });
  const front = upTo(frontCount).flatMap((i) => {
    const inward = i / Math.max(1, frontCount - 1);
    const angle = alternate(i) * (10 + (1 - inward) * open * 0.72);
    const fill = drawing.colours[inward < 0.7 ? 0 : 1];
    return bladeShapes(brush, { angle, bend: angle * 0.7, size: 0.6 - 0.14 * inward, fill, wide: 1.12 }, 2);
  });
  return [...back, ...front];
}

/** Separate leaves on short stalks, lying open. */
export function rosetteShapes(brush: Brush): Shape[] {
  const { drawing, random } = brush;
  const open = 20 + drawing.spread * 0.6;
  return upTo(drawing.leaves).flatMap((i) => {
    const rank = i / (drawing.leaves - 1);
    const lean = alternate(i) * open * (1 - rank) ** 0.8 * (0.85 + 0.3 * random());
    const size = (1 - 0.28 * rank) * (0.88 + 0.2 * random());
    return stalkedLeaf(brush, { angle: lean * 0.62, bend: lean * 0.62, size, fill: tone(drawing, rank) }, 0.16);
  });
}

/** Leaves singly on stalks from the base, or tubes that have no blade. */
export function stalkShapes(brush: Brush): Shape[] {
  const { drawing, random } = brush;
  const open = 6 + drawing.spread * 0.6;
  return upTo(drawing.leaves).flatMap((i) => {
    const rank = i / (drawing.leaves - 1);
    const lean = alternate(i) * open * (1 - rank) * (0.82 + 0.36 * random());
    const size = (0.82 + 0.18 * random()) * (1 - 0.16 * rank);
    const fill = tone(drawing, rank);
    if (drawing.leaf === "tube")
      return tubeShapes(brush, { x: lean * 0.8, angle: lean * 0.35, bend: lean * 0.9, size, fill });
    return stalkedLeaf(brush, { x: lean * 0.3, angle: lean * 0.7, bend: lean * 0.6, size, fill }, 0.46);
  });
}

function stalkedLeaf(brush: Brush, placing: Placing, share: number): Shape[] {
  const { drawing } = brush;
  const { bend = 0 } = placing;
  const whole = specFor(brush, placing);
  const neck = alongSpine(whole, share);
  const stalk = { d: spineLine(whole, 0, share + 0.06), width: Math.round(3 + drawing.rib / 6) };
  const top: Placing = {
    ...placing,
    ...neck,
    angle: placing.angle + bend * share,
    bend: bend * (1 - share),
    size: placing.size * (1 - share),
  };
  return [stalk, ...(drawing.leaf === "hand" ? handShapes(brush, top) : bladeShapes(brush, top, 3))];
}

/** Three leaflets spread like a hand, as one shape. */
function handShapes(brush: Brush, placing: Placing): Shape[] {
  const leaflets = [-68, 68, 0].map((turn) =>
    specFor(brush, { ...placing, angle: placing.angle + turn, bend: 0, size: placing.size * (turn ? 0.78 : 1.08) }),
  );
  return [
    filled(brush, leaflets.map((leaf) => leafOutline(leaf, brush.random)).join(""), placing.fill),
    { d: leaflets.map((leaf) => spineLine(leaf, 0, 0.6)).join("") },
  ];
}

/** A hollow blade; with a strong rib its foot is a pale shaft. */
function tubeShapes(brush: Brush, placing: Placing): Shape[] {
  const leaf = specFor(brush, placing);
  const tube = filled(brush, leafOutline({ ...leaf, lobes: 0, frill: 0 }, brush.random), placing.fill);
  if (brush.drawing.rib < 20) return [tube];
  const width = Math.round(leaf.halfWidth * 1.9);
  const { veinColour } = brush.drawing;
  return [
    tube,
    { d: spineLine(leaf, 0.04, 0.4), width, stroke: tint(placing.fill, 0.45) },
    { d: spineLine(leaf, 0.01, 0.28), width: width + 3, stroke: tint(veinColour, -0.16) },
    { d: spineLine(leaf, 0.01, 0.28), width },
  ];
}

/** Stems set with leaves in opposite pairs, smaller toward the crown. */
export function sprigShapes(brush: Brush): Shape[] {
  const { drawing, random } = brush;
  const stems = drawing.leaves > 14 ? 3 : 2;
  const pairs = Math.max(2, Math.round(drawing.leaves / (stems * 2)));
  const open = 6 + drawing.spread * 0.34;
  return [0, 2, 1].slice(0, stems).flatMap((i) => {
    const lean = -open + (2 * open * i) / (stems - 1);
    const stem = {
      x: lean * 0.2,
      y: 0,
      angle: lean * 0.6,
      bend: lean * 0.7,
      length: 320 * (0.9 + 0.12 * random()) * (i === 1 ? 1.08 : 1),
    };
    const line = { d: spineLine(stem, 0, 1), width: Math.round(3 + drawing.rib / 12) };
    return [line, ...upTo(pairs).flatMap((p) => pairShapes(brush, stem, p / (pairs - 1)))];
  });
}

/** Two leaves face to face on the stem, as one shape. */
function pairShapes(brush: Brush, stem: Spine, rank: number): Shape[] {
  const t = 0.24 + 0.74 * rank;
  const at = alongSpine(stem, t);
  const fill = tone(brush.drawing, rank);
  const leaves = [-1, 1].map((side) => {
    const angle = stem.angle + stem.bend * t + side * (76 - 40 * rank);
    return specFor(brush, { ...at, angle, bend: side * 24, size: 1 - 0.42 * rank, fill });
  });
  const joined = (draw: (leaf: LeafSpec) => string) => leaves.map(draw).join("");
  if (brush.drawing.leaf === "thread") return [{ d: joined(threadFrond), width: 2.4, stroke: fill }];
  return [
    filled(
      brush,
      joined((leaf) => leafOutline(leaf, brush.random)),
      fill,
    ),
    { d: joined((leaf) => leafVeins(leaf, rank > 0.5 ? 1 : 2)) },
  ];
}
