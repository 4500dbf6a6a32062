import { bentLine } from "./curve.ts";
import type { Shape } from "./plantDrawing.ts";
import { seededRandom } from "./seededRandom.ts";

/** The box roots are drawn in; same scale and centre as plantViewBox, directly below it. */
export const rootsViewBox = "-320 0 640 150";

const fullGrownDays = 42;

/** Draws roots for a plant sown so many days ago: more of them, and longer, the older it is. */
export function drawRoots(slug: string, daysSinceSowing: number): Shape[] {
  const random = seededRandom(`${slug} roots`);
  const age = Math.min(1, Math.max(0, daysSinceSowing) / fullGrownDays);
  const count = 4 + Math.round(age * 14);
  return Array.from({ length: count }, () => {
    const x = (random() - 0.5) * 30;
    const depth = (20 + 122 * age) * (0.55 + 0.45 * random());
    const aside = (random() - 0.5) * 300 * age ** 1.2;
    return {
      d: bentLine({ x, y: -2 }, { x: x + aside * 0.3, y: depth * 0.45 }, { x: x + aside, y: depth }),
      colour: "#FFFFFF",
      width: Math.round((2.2 + random() * 2.6) * 10) / 10,
    };
  });
}
