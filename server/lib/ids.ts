import { randomBytes, randomInt } from "node:crypto";

/** An unguessable key for links that are handed around (176 bits, 30 characters). */
export const passKey = (): string => randomBytes(22).toString("base64url");

/** Six digits, evenly drawn. */
export const sixDigits = (): string => String(randomInt(1_000_000)).padStart(6, "0");
