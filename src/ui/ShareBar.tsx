import { classes } from "./classes.ts";

type Props = {
  /** What it shows, in words with the figures: "165 of 240 taken". */
  label: string;
  /** From 0 to 1. */
  share: number;
  /** A second figure to hold it against, as a line. */
  mark?: number | undefined;
  className?: string | undefined;
};

/** A share of a number as a bar. */
export function ShareBar({ label, share, mark, className }: Props) {
  return (
    <svg role="img" aria-label={label} width="100%" height="18" className={classes("block min-w-24", className)}>
      <rect y="4" width="100%" height="10" rx="5" className="fill-water" />
      <rect y="4" width={percent(share)} height="10" rx="5" className="fill-water-deep" />
      {mark !== undefined && <rect x={percent(mark * 0.985)} width="3" height="18" className="fill-radicchio" />}
    </svg>
  );
}

const percent = (share: number) => `${Math.round(Math.min(1, Math.max(0, share)) * 1000) / 10}%`;
