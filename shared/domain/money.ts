/** How amounts are written: an ISO 4217 code, its number of minor digits, and a locale. */
export type MoneyFormat = { currency: string; digits: number; locale: string };

const million = 1_000_000;

/** The product of two whole numbers; throws RangeError where it would no longer be exact. */
function exactProduct(a: number, b: number): number {
  const product = a * b;
  if (!Number.isSafeInteger(product)) throw new RangeError(`${a} times ${b} is no exact whole number`);
  return product;
}

/** A fraction of whole numbers rounded to the nearest whole number, a half to the even one; the denominator is above zero. */
export function roundHalfEven(numerator: number, denominator: number): number {
  if (!Number.isSafeInteger(numerator) || !Number.isSafeInteger(denominator) || denominator <= 0)
    throw new RangeError(`${numerator}/${denominator} is no fraction of whole numbers`);
  const left = ((numerator % denominator) + denominator) % denominator;
  const below = (numerator - left) / denominator;
  const half = left - (denominator - left);
  return half > 0 || (half === 0 && below % 2 !== 0) ? below + 1 : below;
}

/** The tax on an amount at a rate in parts per million; where prices include tax, the tax contained in the amount. Half-even. */
export function taxOf(tax: { amountMinor: number; ratePpm: number; included: boolean }): number {
  const { amountMinor, ratePpm, included } = tax;
  return roundHalfEven(exactProduct(amountMinor, ratePpm), included ? million + ratePpm : million);
}

/** The price of so many units, in minor units. */
export const lineTotal = (priceMinor: number, units: number): number => exactProduct(priceMinor, units);

type Order = { lines: readonly { priceMinor: number; units: number }[]; ratePpm: number; included: boolean };

/** The sums of an order in minor units. Tax is computed once, on the sum; the total adds it unless prices include it. */
export function orderTotals({ lines, ratePpm, included }: Order) {
  const subtotalMinor = lines.reduce((sum, line) => sum + lineTotal(line.priceMinor, line.units), 0);
  const taxMinor = taxOf({ amountMinor: subtotalMinor, ratePpm, included });
  return { subtotalMinor, taxMinor, totalMinor: included ? subtotalMinor : subtotalMinor + taxMinor };
}

/** A cash total to the nearest coin there is; halfway goes to the even number of coins. */
export const roundCash = (amountMinor: number, stepMinor: number): number =>
  roundHalfEven(amountMinor, stepMinor) * stepMinor;

/** What to hand back; below zero while too little was given. */
export const changeDue = ({ dueMinor, tenderedMinor }: { dueMinor: number; tenderedMinor: number }): number =>
  tenderedMinor - dueMinor;

/** Shares a whole total out by whole weights (largest remainder, ties to the earlier); the parts sum to the total. Throws RangeError where nothing has weight. */
export function splitByLargestRemainder(total: number, weights: readonly number[]): number[] {
  const sum = weights.reduce((all, weight) => all + weight, 0);
  if (sum <= 0) throw new RangeError("Nothing to share by: no weight is above zero");
  const shares = weights.map((weight, index) => {
    const product = exactProduct(total, weight);
    return { index, whole: Math.floor(product / sum), left: product % sum };
  });
  const over = total - shares.reduce((all, share) => all + share.whole, 0);
  const lucky = new Set([...shares].sort((a, b) => b.left - a.left || a.index - b.index).slice(0, over));
  return shares.map((share) => share.whole + (lucky.has(share) ? 1 : 0));
}

/** Writes an amount of minor units in words for people ("$4.00"). The digits are ISO 4217's, never a browser's guess. */
export function formatMoney(amountMinor: number, { currency, digits, locale }: MoneyFormat): string {
  return new Intl.NumberFormat(locale, {
    style: "currency",
    currency,
    minimumFractionDigits: digits,
    maximumFractionDigits: digits,
  }).format(amountMinor / 10 ** digits);
}

/** Reads what was typed ("3.5", "3,50", "$1,200") as minor units without floating point; null where it is no amount. */
export function parseMoney(text: string, digits: number): number | null {
  const plain = text.trim().replace(/^[^\d-]+/, "");
  const match = /^(-?)(\d{1,3}(?:,\d{3})+|\d+)(?:[.,](\d*))?$/.exec(plain);
  if (!match) return null;
  const [, sign, whole, part = ""] = match;
  if (part.length > digits || whole === undefined) return null;
  const minor = Number(whole.replaceAll(",", "") + part.padEnd(digits, "0"));
  return Number.isSafeInteger(minor) ? (sign ? 0 - minor : minor) : null;
}
