/** One day of a supply line's harvest week; all counts are cumulative from Monday, in units of the line's form and grade. */
export type SupplyDay = { onDay: string; promised: number; claimed: number; broken: number };

/** What can still be promised for a day: the least room from that day to the end of the week, never below zero. */
export function roomOn(days: readonly SupplyDay[], onDay: string): number {
  const later = days.filter((day) => day.onDay >= onDay);
  return later.length === 0 ? 0 : Math.max(0, Math.min(...later.map((day) => day.promised - day.claimed)));
}

/** The days after `units` more are claimed for `onDay`; null when there is not so much room. */
export function claimOn(days: readonly SupplyDay[], onDay: string, units: number): SupplyDay[] | null {
  if (units > roomOn(days, onDay)) return null;
  return days.map((day) => (day.onDay < onDay ? day : { ...day, claimed: day.claimed + units }));
}

/** Whether the days keep the law: nothing claimed above promised plus broken, and nothing new while broken. */
export const lawHolds = (days: readonly SupplyDay[]): boolean =>
  days.every(
    ({ promised, claimed, broken }) => claimed <= promised + broken && (broken === 0 || claimed === promised + broken),
  );
