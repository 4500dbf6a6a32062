/**
 * One day of a supply line's harvest week; all counts are cumulative from Monday, in units of the line's form and
 * grade. `broken` are claims above what is promised: promises that cannot be kept as things stand.
 */
export type SupplyDay = { onDay: string; promised: number; claimed: number; broken: number };

type Days = readonly SupplyDay[];

const settled = (day: SupplyDay): SupplyDay => ({ ...day, broken: Math.max(0, day.claimed - day.promised) });

/** What can still be promised for a day: the least room from that day to the end of the week, never below zero. */
export function roomOn(days: Days, onDay: string): number {
  const later = days.filter((day) => day.onDay >= onDay);
  return later.length === 0 ? 0 : Math.max(0, Math.min(...later.map((day) => day.promised - day.claimed)));
}

/** The days after `units` more are claimed for `onDay`; null when there is not so much room. */
export function claimOn(days: Days, onDay: string, units: number): SupplyDay[] | null {
  if (units > roomOn(days, onDay)) return null;
  return days.map((day) => (day.onDay < onDay ? day : { ...day, claimed: day.claimed + units }));
}

/** The days after `units` claimed for `onDay` are given back, which mends broken promises first; throws RangeError where that day has not so many claims. */
export function releaseOn(days: Days, onDay: string, units: number): SupplyDay[] {
  const claimedBy = (isUpTo: (day: SupplyDay) => boolean) =>
    Math.max(0, ...days.filter(isUpTo).map((day) => day.claimed));
  const claimedThatDay = claimedBy((day) => day.onDay <= onDay) - claimedBy((day) => day.onDay < onDay);
  if (units > claimedThatDay) throw new RangeError(`${onDay} has ${claimedThatDay} claimed, not ${units}`);
  return days.map((day) => (day.onDay < onDay ? day : settled({ ...day, claimed: day.claimed - units })));
}

/** The days after the owner edits what is promised (cumulative, by date; days not named keep theirs). What is claimed above it is broken, never refused. */
export function withPromised(days: Days, promisedByDay: Readonly<Record<string, number>>): SupplyDay[] {
  return days.map((day) => settled({ ...day, promised: promisedByDay[day.onDay] ?? day.promised }));
}

/** Whether the days keep the law: nothing claimed above promised plus broken, and nothing new while broken. */
export const lawHolds = (days: Days): boolean =>
  days.every(
    ({ promised, claimed, broken }) => claimed <= promised + broken && (broken === 0 || claimed === promised + broken),
  );

/** How many units of promises are broken: the most on any day, because one head missing on Friday is still missing on Saturday. */
export const brokenUnits = (days: Days): number => Math.max(0, ...days.map((day) => day.broken));

type OfferOnDay = {
  parts: readonly { units: number; days: Days }[];
  maxUnits: number | null;
  taken: number;
  onDay: string;
};

/** How many of an offer can still be ordered for a day: what its scarcest part allows, within the day's limit. */
export function unitsLeft({ parts, maxUnits, taken, onDay }: OfferOnDay): number {
  const byPart = parts.map(({ units, days }) => Math.floor(roomOn(days, onDay) / units));
  const byLimit = maxUnits === null ? Infinity : maxUnits - taken;
  return parts.length === 0 ? 0 : Math.max(0, Math.min(byLimit, ...byPart));
}
