/** Writes minor units as a person would type them: 350 with 2 digits is "3.50". */
export function minorToText(amountMinor: number, digits: number): string {
  const sign = amountMinor < 0 ? "-" : "";
  const figures = String(Math.abs(amountMinor)).padStart(digits + 1, "0");
  return digits === 0 ? sign + figures : `${sign}${figures.slice(0, -digits)}.${figures.slice(-digits)}`;
}

/** Reads what was typed ("3.5", "3,50", "1,200") as minor units without floating point; null where it is no amount. */
export function textToMinor(text: string, digits: number): number | null {
  const plain = text.trim().replace(/^[^\d-]+/, "");
  const match = /^(-?)(\d{1,3}(?:,\d{3})+|\d+)(?:[.,](\d*))?$/.exec(plain);
  if (!match) return null;
  const [, sign, whole, part = ""] = match;
  if (part.length > digits || whole === undefined) return null;
  const minor = Number(whole.replaceAll(",", "") + part.padEnd(digits, "0"));
  return Number.isSafeInteger(minor) ? (sign ? -minor : minor) : null;
}
