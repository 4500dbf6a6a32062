/** A stream of numbers in [0, 1) that is the same for the same seed everywhere (mulberry32 over a string hash). */
export function seededRandom(seed: string): () => number {
  let state = 7;
  for (const character of seed) state = (Math.imul(state, 31) + character.charCodeAt(0)) >>> 0;
  return () => {
    state = (state + 0x6d2b79f5) | 0;
    let t = Math.imul(state ^ (state >>> 15), 1 | state);
    t = (t + Math.imul(t ^ (t >>> 7), 61 | t)) ^ t;
    return ((t ^ (t >>> 14)) >>> 0) / 4294967296;
  };
}
