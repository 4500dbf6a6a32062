/** Writes minor units as a person would type them: 350 with 2 digits is "3.50". */
export function minorToText(amountMinor: number, digits: number): string {
  const sign = amountMinor < 0 ? "-" : "";
  const figures = String(Math.abs(amountMinor)).padStart(digits + 1, "0");
  return digits === 0 ? sign + figures : `${sign}${figures.slice(0, -digits)}.${figures.slice(-digits)}`;
}
