import { bentLine } from "./curve.ts";
import { alongSpine, leafOutline, leafVeins, type LeafSpec } from "./leaf.ts";
import type { PlantDrawing, Shape } from "./plantDrawing.ts";

/** What the habits draw with: the variety's numbers and its own stream of chance. */
export type Brush = { drawing: PlantDrawing; random: () => number };

const roomAbove = 372;

type Placing = { x?: number; y?: number; angle: number; bend?: number; size: number; colour: string; wide?: number };

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

/** A blade with its midrib and side veins. */
export function bladeShapes(brush: Brush, placing: Placing, veins = 3): Shape[] {
  const leaf = specFor(brush, placing);
  const { drawing, random } = brush;
  const lines = leafVeins(leaf, veins);
  const rib = 1.5 + (drawing.rib / 100) * 14 * placing.size;
  return [
    { d: leafOutline(leaf, random), colour: placing.colour },
    { d: lines.rib, colour: drawing.veinColour, width: Math.round(rib * 10) / 10 },
    ...(veins > 0 ? [{ d: lines.veins, colour: drawing.veinColour, width: 1.5 }] : []),
  ];
}

/** Leaves wrapped about a heart: outer ones open and dark behind, the heart pale, short ones in front. */
export function headShapes(brush: Brush): Shape[] {
  const { drawing, random } = brush;
  const [outer, middle, heart] = drawing.colours;
  const open = 20 + (drawing.spread / 100) * 75;
  const front = Math.max(2, Math.round(drawing.leaves * 0.28));
  const back = drawing.leaves - front;
  const shapes: Shape[] = [];
  for (let i = 0; i < back; i++) {
    const inward = i / (back - 1);
    const side = i % 2 ? 1 : -1;
    const angle = side * (1 - inward) * open * (0.82 + 0.3 * random());
    const size = (0.88 + 0.12 * (1 - Math.abs(inward - 0.4))) * (0.94 + 0.1 * random()) * (inward > 0.8 ? 0.86 : 1);
    const colour = inward < 0.36 ? outer : inward < 0.72 ? middle : heart;
    shapes.push(
      ...bladeShapes(brush, { x: side * 6 * (1 - inward), angle, bend: side * (1 - inward) * 26, size, colour }),
    );
  }
  for (let i = 0; i < front; i++) {
    const inward = i / Math.max(1, front - 1);
    const side = i % 2 ? 1 : -1;
    const angle = side * (18 + (1 - inward) * open * 0.72);
    shapes.push(
      ...bladeShapes(
        brush,
        { angle, bend: side * 30, size: 0.56 - 0.1 * inward, colour: inward < 0.6 ? outer : middle, wide: 1.15 },
        2,
      ),
    );
  }
  return shapes;
}

/** Separate leaves on short stalks, lying open. */
export function rosetteShapes(brush: Brush): Shape[] {
  const { drawing, random } = brush;
  const open = 25 + (drawing.spread / 100) * 65;
  return Array.from({ length: drawing.leaves }, (_, i) => i).flatMap((i) => {
    const rank = i / (drawing.leaves - 1);
    const side = i % 2 ? 1 : -1;
    const angle = side * open * (1 - rank) ** 0.8 * (0.85 + 0.3 * random());
    const size = (0.78 + 0.22 * (1 - rank)) * (0.9 + 0.2 * random());
    return stalkedLeaf(
      brush,
      { angle: angle * 0.7, bend: angle * 0.55, size, colour: drawing.colours[Math.min(2, Math.floor(rank * 3))]! },
      0.22,
    );
  });
}

/** Leaves singly on stalks from the base; tubes and threads have no blade. */
export function stalkShapes(brush: Brush): Shape[] {
  const { drawing, random } = brush;
  const open = 8 + (drawing.spread / 100) * 60;
  return Array.from({ length: drawing.leaves }, (_, i) => i).flatMap((i) => {
    const rank = i / (drawing.leaves - 1);
    const side = i % 2 ? 1 : -1;
    const angle = side * open * (1 - rank) * (0.8 + 0.4 * random());
    const size = (0.8 + 0.2 * rank) * (0.86 + 0.14 * random());
    const colour = drawing.colours[Math.min(2, Math.floor(rank * 3))]!;
    const placing: Placing = { x: side * 8 * random(), angle: angle * 0.75, bend: angle * 0.5, size, colour };
    if (drawing.leaf === "tube") return tubeShapes(brush, placing);
    return stalkedLeaf(brush, placing, 0.42);
  });
}

function stalkedLeaf(brush: Brush, placing: Placing, share: number): Shape[] {
  const { drawing } = brush;
  const whole = specFor(brush, placing);
  const neck = alongSpine(whole, share);
  const half = alongSpine(whole, share / 2);
  const top: Placing = {
    ...placing,
    x: neck.x,
    y: neck.y,
    angle: placing.angle + (placing.bend ?? 0) * share,
    bend: (placing.bend ?? 0) * (1 - share),
    size: placing.size * (1 - share),
  };
  const stalk = {
    d: bentLine(alongSpine(whole, 0), half, neck),
    colour: drawing.veinColour,
    width: Math.round(3 + drawing.rib / 6),
  };
  if (drawing.leaf === "hand") return [stalk, ...handShapes(brush, top)];
  return [stalk, ...bladeShapes(brush, top)];
}

function handShapes(brush: Brush, placing: Placing): Shape[] {
  return [-62, 62, 0].flatMap((turn) =>
    bladeShapes(brush, { ...placing, angle: placing.angle + turn, bend: 0, size: placing.size * (turn ? 0.8 : 1) }, 0),
  );
}

function tubeShapes(brush: Brush, placing: Placing): Shape[] {
  return [{ d: leafOutline({ ...specFor(brush, placing), lobes: 0, frill: 0 }, brush.random), colour: placing.colour }];
}

/** Stems set with leaves in opposite pairs and a small crown. */
export function sprigShapes(brush: Brush): Shape[] {
  const { drawing, random } = brush;
  const stems = drawing.leaves > 14 ? 3 : 2;
  const pairs = Math.max(2, Math.floor(drawing.leaves / (stems * 2)));
  const open = 6 + (drawing.spread / 100) * 34;
  return Array.from({ length: stems }, (_, i) => i).flatMap((i) => {
    const lean = -open + (2 * open * i) / (stems - 1);
    const stem = { x: 0, y: 0, angle: lean * 0.6, bend: lean * 0.7, length: 300 * (0.9 + 0.15 * random()) };
    const line = {
      d: bentLine(alongSpine(stem, 0), alongSpine(stem, 0.5), alongSpine(stem, 1)),
      colour: drawing.veinColour,
      width: 3 + drawing.rib / 12,
    };
    const shapes: Shape[] = [line];
    for (let p = 0; p < pairs; p++) {
      const t = 0.24 + (0.72 * p) / (pairs - 1);
      const at = alongSpine(stem, t);
      for (const side of [-1, 1]) {
        const colour = drawing.colours[Math.min(2, Math.floor((3 * p) / pairs))]!;
        shapes.push(
          ...bladeShapes(
            brush,
            {
              x: at.x,
              y: at.y,
              angle: lean * 0.6 + lean * 0.7 * t + side * (70 - 30 * t),
              bend: side * 20,
              size: 1 - 0.45 * t,
              colour,
            },
            2,
          ),
        );
      }
    }
    return shapes;
  });
}
