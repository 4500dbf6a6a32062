import { classes } from "./classes.ts";

/** A pickup's three-character code, the thing to look for on a crate. */
export function PickupCode({ code, size = "regular" }: { code: string; size?: "regular" | "large" | undefined }) {
  return (
    <span
      className={classes(
        "num inline-grid place-items-center rounded-full bg-awning font-semibold tracking-wide text-awning-ink print:border-2",
        size === "large" ? "px-8 py-3 text-head" : "min-h-touch min-w-16 px-3 text-lead",
      )}
    >
      {code}
    </span>
  );
}
