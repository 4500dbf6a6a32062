/** A point of a drawing, in SVG units; `corner` breaks the smooth line there. */
export type Point = { x: number; y: number; corner?: boolean };

const round = Math.round;
const join = (numbers: number[]) => numbers.map((n, i) => (i > 0 && n >= 0 ? ` ${n}` : `${n}`)).join("");

/**
 * A closed smooth outline through the points (Catmull-Rom as relative cubic Beziers, whole units).
 * After a point that is no corner the first handle mirrors the last, so the short `s` form is exact.
 */
export function smoothOutline(points: Point[]): string {
  const at = points.map((p) => ({ ...p, x: round(p.x), y: round(p.y) }));
  const count = at.length;
  const get = (i: number) => at[(i + count) % count]!;
  const handle = (i: number): [number, number] => {
    if (get(i).corner) return [0, 0];
    return [(get(i + 1).x - get(i - 1).x) / 6, (get(i + 1).y - get(i - 1).y) / 6];
  };
  let d = `M${join([get(0).x, get(0).y])}`;
  for (let i = 0; i < count; i++) {
    const from = get(i),
      to = get(i + 1);
    const [outX, outY] = handle(i),
      [inX, inY] = handle(i + 1);
    const end = [round(to.x - inX - from.x), round(to.y - inY - from.y), to.x - from.x, to.y - from.y];
    d += i === 0 || from.corner ? `c${join([round(outX), round(outY), ...end])}` : `s${join(end)}`;
  }
  return d + "Z";
}

/**
 * A closed outline of small bows, each standing out from its chord by `bulge` of the chord's length:
 * the crinkled edge of a frilled leaf. The outline runs clockwise, so "out" is to the left.
 */
export function bowedOutline(points: Point[], bulge: (index: number) => number): string {
  const at = points.map((p) => ({ x: round(p.x), y: round(p.y) }));
  let d = `M${join([at[0]!.x, at[0]!.y])}`;
  at.forEach((from, i) => {
    const to = at[(i + 1) % at.length]!;
    const dx = to.x - from.x,
      dy = to.y - from.y,
      b = bulge(i);
    d += `q${join([round(dx / 2 + dy * b), round(dy / 2 - dx * b), dx, dy])}`;
  });
  return d + "Z";
}

/** An open line through two or three points, bent smoothly. */
export function bentLine(from: Point, via: Point, to: Point): string {
  const x = round(from.x),
    y = round(from.y);
  return `M${join([x, y])}q${join([round(via.x) - x, round(via.y) - y, round(to.x) - x, round(to.y) - y])}`;
}

/** An open line of straight strokes. */
export function polyline(...points: Point[]): string {
  const at = points.map(({ x, y }) => ({ x: round(x), y: round(y) }));
  const steps = at.slice(1).flatMap(({ x, y }, i) => [x - at[i]!.x, y - at[i]!.y]);
  return `M${join([at[0]!.x, at[0]!.y])}l${join(steps)}`;
}
