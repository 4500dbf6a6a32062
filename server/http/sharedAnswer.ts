import type { House } from "./context.ts";
import { wallNow } from "../lib/clock.ts";

type Kept = { madeAtMs: number; text: Promise<string> };
const kept = new WeakMap<House, Map<string, Kept>>();
const MOST = 500;

/**
 * One computation at a time for an answer that is the same for everyone, kept for a moment (milliseconds).
 * Only what a page shows comes from here; every promise is checked against the database when it is made.
 */
export function sharedAnswer(house: House, key: string, forMs: number, make: () => Promise<string>): Promise<string> {
  let answers = kept.get(house);
  if (!answers) kept.set(house, (answers = new Map()));
  const nowMs = wallNow().getTime();
  const found = answers.get(key);
  if (found && nowMs - found.madeAtMs < forMs) return found.text;
  if (answers.size >= MOST) answers.clear();
  const text = make();
  answers.set(key, { madeAtMs: nowMs, text });
  text.catch(() => answers.delete(key));
  return text;
}
