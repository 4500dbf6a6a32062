import type { Picture } from "./plantDrawing.ts";
import { seededRandom } from "./seededRandom.ts";

/** The box roots are drawn in; same scale and centre as plantViewBox, directly below it. */
export const rootsViewBox = "-320 0 640 150";

/** Days after which roots fill their box: about the age at which a head is pulled. */
const fullGrownDays = 42;
const mostRoots = 20;

/** Draws roots for a plant sown so many days ago: more of them, and longer, the older it is. */
export function drawRoots(slug: string, daysSinceSowing: number): Picture {
  const random = seededRandom(`${slug} roots`);
  const age = Math.min(1, Math.max(0, daysSinceSowing) / fullGrownDays);
  const count = 4 + Math.round(age * (mostRoots - 4));
  const roots = Array.from({ length: count }, () => {
    const x = Math.round((random() - 0.5) * 34);
    const depth = (16 + 130 * age) * (0.5 + 0.5 * random());
    const aside = (random() - 0.5) * 330 * age;
    const hook = (random() - 0.5) * 26;
    const end = [aside * 0.1, depth * 0.5, aside * 0.7 + hook, depth * 0.55, aside, depth].map(Math.round);
    return `M${x}-3c${end.join(" ")}`;
  });
  const stout = Math.ceil(count / 3);
  return {
    line: "#FFFFFF",
    shapes: [
      { d: roots.slice(0, stout).join(""), width: 4.4 },
      { d: roots.slice(stout).join(""), width: 2.6 },
    ],
  };
}
