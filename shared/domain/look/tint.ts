/** A #RRGGBB colour made lighter (share above 0, toward white) or darker (below 0, toward black). */
export function tint(colour: string, share: number): string {
  const toward = share > 0 ? 255 : 0;
  const mixed = [1, 3, 5].map((at) => {
    const value = parseInt(colour.slice(at, at + 2), 16);
    return Math.round(value + (toward - value) * Math.abs(share));
  });
  return `#${mixed.map((value) => value.toString(16).padStart(2, "0")).join("")}`;
}
