import { z } from "zod";

const percent = z.number().int().min(0).max(100);
const colour = z.string().regex(/^#[0-9A-Fa-f]{6}$/);

/**
 * The numbers a variety is drawn from. All whole and bounded, so each is a slider for the owner.
 * Percentages are of the room above the waterline (leafLength), of the leaf's own length
 * (leafWidth, shoulder) or of the strongest effect (the rest).
 */
export const plantDrawingSchema = z.object({
  /** How leaves are set: wrapped in a head, open in a rosette, in pairs on stems, or singly on stalks from the base. */
  habit: z.enum(["head", "rosette", "sprig", "stalk"]),
  /** What one leaf is: a plain blade, leaflets spread like a hand, threads, or a tube. */
  leaf: z.enum(["blade", "hand", "thread", "tube"]),
  leafLength: percent.min(15),
  leafWidth: percent.min(2),
  /** Where along its length the leaf is widest, from base to tip. */
  shoulder: percent.min(15).max(90),
  /** 0 is a pointed tip, 100 a blunt round one. */
  roundness: percent,
  /** Depth of the bays between lobes. */
  lobe: percent,
  /** Lobes on each side. */
  lobes: z.number().int().min(0).max(7),
  /** How crinkled the edge is. */
  frill: percent,
  leaves: z.number().int().min(3).max(30),
  /** 0 stands upright, 100 lies open. */
  spread: percent,
  /** Thickness of the midrib or stalk. */
  rib: percent,
  /** Outer, middle and heart leaves, back to front. */
  colours: z.tuple([colour, colour, colour]),
  /** Midribs, veins and stalks. */
  veinColour: colour,
});

export type PlantDrawing = z.infer<typeof plantDrawingSchema>;

/** One path of a picture: filled where it has a `fill`; `stroke` and `width` where they are not the picture's own. */
export type Shape = { d: string; fill?: string; stroke?: string; width?: number };

/** What a drawing function answers: shapes back to front, and the colour of every line that names none. */
export type Picture = { line: string; shapes: Shape[] };
