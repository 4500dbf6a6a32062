// What the commands say while they work: one line per step, and a sign of life on anything longer than two seconds.

const isTerminal = process.stdout.isTTY === true;
const patienceMs = 2_000;
const plainEveryMs = 15_000;
const frames = ["⠋", "⠙", "⠹", "⠸", "⠼", "⠴", "⠦", "⠧", "⠇", "⠏"];

/** @typedef {{ title: string, startedMs: number, said: string, nextPlainMs: number }} Running */

/** @type {Set<Running>} */
const running = new Set();
/** @type {NodeJS.Timeout | undefined} */
let ticker;

/**
 * Prints a line, above the spinner if one turns.
 * @param {string} [line]
 */
export function print(line = "") {
  process.stdout.write(isTerminal && ticker ? `\r\x1b[K${line}\n` : `${line}\n`);
}

/**
 * Says what went wrong, without the stack, and lets the command end with 1.
 * @param {unknown} error
 */
export function fail(error) {
  print(error instanceof Error ? error.message : String(error));
  process.exitCode = 1;
}

/**
 * Does a piece of work and shows it: its title while it lasts, then a line with the time it took.
 * @template T
 * @param {string} title
 * @param {(say: (text: string) => void) => Promise<T> | T} work what it says last stands on the finished line
 * @param {(result: T) => boolean} [isGood] marks the line when the work ends without throwing
 * @returns {Promise<T>}
 */
export async function step(title, work, isGood = () => true) {
  const startedMs = performance.now();
  const entry = { title, startedMs, said: "", nextPlainMs: startedMs + patienceMs };
  running.add(entry);
  ticker ??= setInterval(tick, isTerminal ? 100 : 500);
  try {
    const result = await work((text) => (entry.said = text.trim()));
    finish(entry, isGood(result) ? "✓" : "✗");
    return result;
  } catch (error) {
    finish(entry, "✗");
    throw error;
  }
}

/** @param {Running} entry @param {string} mark */
function finish(entry, mark) {
  running.delete(entry);
  print(`${mark} ${describe(entry)}  ${seconds(performance.now() - entry.startedMs)}`);
  if (running.size > 0) return;
  clearInterval(ticker);
  ticker = undefined;
}

function tick() {
  const nowMs = performance.now();
  if (isTerminal) {
    const frame = frames[Math.floor(nowMs / 100) % frames.length];
    const all = [...running].map((entry) => `${describe(entry)}  ${seconds(nowMs - entry.startedMs)}`).join("   ");
    process.stdout.write(`\r\x1b[K${frame} ${all}`.slice(0, (process.stdout.columns || 80) + 3));
    return;
  }
  for (const entry of running) {
    if (nowMs < entry.nextPlainMs) continue;
    entry.nextPlainMs = nowMs + plainEveryMs;
    print(`… ${describe(entry)}  ${seconds(nowMs - entry.startedMs)}`);
  }
}

/** @param {Running} entry */
function describe({ title, said }) {
  return said ? `${title}: ${said}` : title;
}

/** @param {number} ms */
function seconds(ms) {
  return ms < 60_000
    ? `${(ms / 1000).toFixed(1)} s`
    : `${Math.floor(ms / 60_000)} min ${Math.round((ms % 60_000) / 1000)} s`;
}
