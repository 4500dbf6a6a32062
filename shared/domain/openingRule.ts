import * as rrule from "rrule";
import { isPlainDate } from "./calendar.ts";

/** The package is CommonJS to Node, which hands it over as `default`, and an ES module to a bundler. */
const parts: typeof rrule & { default?: typeof rrule } = rrule;
const { RRule } = parts.default ?? parts;

const weekday = "(MO|TU|WE|TH|FR|SA|SU)";
const listOf = (item: string) => new RegExp(`^${item}(,${item})*$`);
const days = listOf(weekday);
const valueOf: Readonly<Record<string, RegExp>> = {
  FREQ: /^(DAILY|WEEKLY|MONTHLY|YEARLY)$/,
  INTERVAL: /^([1-9]|[1-4]\d|5[0-2])$/,
  COUNT: /^[1-9]\d{0,2}$/,
  UNTIL: /^\d{8}$/,
  BYDAY: listOf(`([+-]?[1-5])?${weekday}`),
  BYMONTH: listOf("([1-9]|1[0-2])"),
  BYMONTHDAY: listOf("-?([1-9]|[12]\\d|3[01])"),
  WKST: new RegExp(`^${weekday}$`),
};
const notARule = "This is not a recurrence rule, such as FREQ=WEEKLY;BYDAY=SA.";

/** What is wrong with one part; null when it is right by itself. */
function partProblem(name: string, value: string): string | null {
  if (/^BY(HOUR|MINUTE|SECOND)$/.test(name)) return "A market opens on days; its hours stand beside the rule.";
  if (name === "FREQ" && /^(HOURLY|MINUTELY|SECONDLY)$/.test(value)) return "A market opens daily at the most often.";
  if (name === "DTSTART") return "The first date stands beside the rule, not inside it.";
  const allowed = valueOf[name];
  if (!allowed) return /^[A-Z]+$/.test(name) ? `A market's rule has no ${name}.` : notARule;
  if (!allowed.test(value)) return `${name}=${value} is not possible.`;
  const isUntil = name === "UNTIL";
  const until = `${value.slice(0, 4)}-${value.slice(4, 6)}-${value.slice(6)}`;
  return isUntil && !isPlainDate(until) ? "UNTIL is a date that exists, such as 20261031." : null;
}

/** What is wrong with parts that are right one by one but not together (RFC 5545, 3.3.10); null when they agree. */
function togetherProblem(rule: ReadonlyMap<string, string>): string | null {
  const freq = rule.get("FREQ");
  if (rule.has("COUNT") && rule.has("UNTIL")) return "A rule ends by COUNT or by UNTIL, not both.";
  if (freq === "DAILY" && ["BYDAY", "BYMONTH", "BYMONTHDAY"].some((name) => rule.has(name)))
    return "For chosen days write FREQ=WEEKLY with BYDAY.";
  if (freq === "WEEKLY" && rule.has("BYMONTHDAY")) return "A weekly rule has no BYMONTHDAY.";
  if (freq === "WEEKLY" && rule.has("BYDAY") && !days.test(rule.get("BYDAY") ?? ""))
    return "A weekly rule names days without a number, such as BYDAY=SA.";
  return null;
}

/**
 * What is wrong with an RFC 5545 recurrence rule, as a sentence; null when a market can follow it. Only parts whose
 * expansion is bounded are taken: days, weeks, months and years, no hours, no positions.
 */
export function ruleProblem(text: string): string | null {
  if (text.length > 200) return notARule;
  const rule = new Map<string, string>();
  for (const part of text.split(";")) {
    const [name = "", value, ...rest] = part.split("=");
    if (value === undefined || rest.length > 0 || rule.has(name)) return notARule;
    const problem = partProblem(name, value);
    if (problem) return problem;
    rule.set(name, value);
  }
  return rule.has("FREQ") ? togetherProblem(rule) : notARule;
}

/** A rule that `ruleProblem` accepts, in words: "Every Saturday", "Every 2 weeks on Saturday". */
export function describeRule(text: string): string {
  const words = RRule.fromString(text)
    .toText()
    .replace(/^every week on /, "every ")
    .replace(/, (?=[A-Z][a-z]+day\b(?!,))/, " and ")
    .replace(/on the last$/, "on the last day");
  return words.charAt(0).toUpperCase() + words.slice(1);
}

const utc = (on: string): Date => new Date(`${on}T00:00:00Z`);

/** The dates from `from` to `to`, both included, that a rule gives when it begins on `startsOn`. Expanded without a zone, so daylight saving never shifts a day. */
export function ruleDates({ rule, startsOn, from, to }: Record<"rule" | "startsOn" | "from" | "to", string>): string[] {
  if (from > to) return [];
  const dates = new RRule({ ...RRule.parseString(rule), dtstart: utc(startsOn) });
  return dates.between(utc(from), utc(to), true).map((day) => day.toISOString().slice(0, 10));
}
