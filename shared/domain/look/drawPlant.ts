import { headShapes, rosetteShapes, sprigShapes, stalkShapes } from "./habits.ts";
import type { PlantDrawing, Shape } from "./plantDrawing.ts";
import { seededRandom } from "./seededRandom.ts";

/**
 * The box every plant is drawn in: the base stands at (0, 0) on the waterline, leaves go up (negative y).
 * `rootsViewBox` has the same scale and centre and lies directly below, so the two join without a seam.
 */
export const plantViewBox = "-320 -400 640 400";

/** Draws a variety's leaves: the same shapes for the same slug and numbers, back to front. */
export function drawPlant(slug: string, drawing: PlantDrawing): Shape[] {
  const brush = { drawing, random: seededRandom(slug) };
  switch (drawing.habit) {
    case "head":
      return headShapes(brush);
    case "rosette":
      return rosetteShapes(brush);
    case "sprig":
      return sprigShapes(brush);
    case "stalk":
      return stalkShapes(brush);
    default:
      throw new Error(`no such habit: ${drawing.habit satisfies never}`);
  }
}
