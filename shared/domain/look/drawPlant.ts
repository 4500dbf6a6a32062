import { type Brush, headShapes, rosetteShapes, sprigShapes, stalkShapes } from "./habits.ts";
import type { Picture, PlantDrawing, Shape } from "./plantDrawing.ts";
import { seededRandom } from "./seededRandom.ts";

/**
 * The box every plant is drawn in: the base stands at (0, 0) on the waterline, leaves go up (negative y).
 * `rootsViewBox` has the same scale and centre and lies directly below, so the two join without a seam.
 */
export const plantViewBox = "-320 -400 640 400";

/** Draws a variety's leaves: the same picture for the same slug and numbers. */
export function drawPlant(slug: string, drawing: PlantDrawing): Picture {
  return { line: drawing.veinColour, shapes: leavesOf({ drawing, random: seededRandom(slug) }) };
}

function leavesOf(brush: Brush): Shape[] {
  const { habit } = brush.drawing;
  switch (habit) {
    case "head":
      return headShapes(brush);
    case "rosette":
      return rosetteShapes(brush);
    case "sprig":
      return sprigShapes(brush);
    case "stalk":
      return stalkShapes(brush);
    default:
      throw new Error(`no such habit: ${habit satisfies never}`);
  }
}
