import { z } from "zod";

/** One endpoint as both sides see it. Everything needs a signed-in person unless `isPublic`. */
export type Contract = {
  readonly method: "GET" | "POST" | "PUT" | "PATCH" | "DELETE";
  readonly path: `/api/${string}`;
  readonly summary: string;
  readonly input: z.ZodType;
  readonly output: z.ZodType;
  /** Anyone may call it. */
  readonly isPublic?: true;
  /** It makes something: an Idempotency-Key is required, and the same key with the same body gets the same answer. */
  readonly makes?: true;
  /** The answer is the same for everyone and may be this old, in milliseconds. */
  readonly sharedForMs?: number;
};

export type Input<C extends Contract> = z.input<C["input"]>;
export type Output<C extends Contract> = z.output<C["output"]>;

export const noInput = z.object({});
export const okDto = z.object({ ok: z.literal(true) });
export const idInput = z.object({ id: z.uuid() });
export const instant = z.iso.datetime();
export const versionNumber = z.int().min(1);

/** Free text: trimmed, bounded, without control characters but line breaks and tabs. */
export const text = (max: number) =>
  z
    .string()
    .trim()
    .max(max, `At most ${max} characters, please.`)
    .refine(
      (value) => !/[\u0000-\u0008\u000b\u000c\u000e-\u001f\u007f]/.test(value),
      "This has characters we cannot store.",
    );

/** Text that may not be empty. */
export const required = (max: number, sentence = "Please fill this in.") =>
  text(max).refine((value) => value !== "", sentence);

export const slugText = z
  .string()
  .trim()
  .max(60)
  .regex(/^[a-z0-9]+(-[a-z0-9]+)*$/, "Small letters, digits and single hyphens only.");
