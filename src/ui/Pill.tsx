import type { ReactNode } from "react";
import { classes } from "./classes.ts";

export type PillTone = "good" | "scarce" | "short" | "plain";

const tones: Record<PillTone, string> = {
  good: "bg-leaf-soft text-leaf-ink",
  scarce: "bg-awning-soft text-awning-ink",
  short: "bg-radicchio-soft text-radicchio",
  plain: "bg-water text-ink",
};

/** A state in a word or two ("On plan", "Short 16"); the colour only underlines the word. */
export function Pill({
  tone = "plain",
  children,
  className,
}: {
  tone?: PillTone | undefined;
  children: ReactNode;
  className?: string | undefined;
}) {
  return (
    <span
      className={classes(
        "num inline-block rounded-full px-2.5 py-0.5 text-small font-semibold whitespace-nowrap print:border",
        tones[tone],
        className,
      )}
    >
      {children}
    </span>
  );
}
