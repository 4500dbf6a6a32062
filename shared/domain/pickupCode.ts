/** How many characters a pickup code has. */
export const PICKUP_CODE_LENGTH = 3;

/** No vowels, and of each pair that looks alike only one: no B by 8, no S by 5, no Z by 2, no L, I or 1, no O or 0. */
const alphabet = [..."CDFGHJKMNPQRTVWX2589"];

/** Codes nobody should be called out by: rude or ugly when read as letters, or by what the figures stand for. */
const unwanted =
  /88|H8R|[FP][CHKQ]K|F[CKQ][KN]|[CKQ]NT|[CDK][CKQ]K|W[HN]K|TWT|TRD|WTF|FFS|FTW|NGR|XXX|JRK|RPD|RTD|FGT|PRN|PMP|MFR|CRP|FRT|DMN/;

const codes = alphabet
  .flatMap((a) => alphabet.flatMap((b) => alphabet.map((c) => a + b + c)))
  .filter((code) => !unwanted.test(code));
const known = new Set(codes);

/** How many pickup codes there are. */
export const pickupCodeCount = codes.length;

/** The pickup code at an index from 0 to pickupCodeCount - 1, each a different one; throws RangeError beyond. */
export function pickupCodeAt(index: number): string {
  const code = codes[index];
  if (code === undefined) throw new RangeError(`There is no pickup code ${index}`);
  return code;
}

const twins: Readonly<Record<string, string>> = { B: "8", S: "5", Z: "2", "6": "G", U: "V" };

/** What was typed, as a code is written: capitals, nothing between them, look-alikes replaced by what is in the alphabet. */
export const normaliseCode = (typed: string): string =>
  typed
    .toUpperCase()
    .replace(/[^A-Z0-9]/g, "")
    .replace(/[BSZ6U]/g, (character) => twins[character] ?? character);

/** Whether a text is a pickup code, exactly as written. */
export const isPickupCode = (text: string): boolean => known.has(text);
