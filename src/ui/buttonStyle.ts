import { classes } from "./classes.ts";

export type ButtonVariant = "primary" | "quiet" | "danger";
export type ButtonSize = "regular" | "small" | "stall";

const variants: Record<ButtonVariant, string> = {
  primary: "bg-water-deep text-on-primary border-water-deep hover:bg-ink hover:border-ink hover:text-mist",
  quiet: "bg-transparent text-water-deep border-water-deep hover:bg-water",
  danger: "bg-transparent text-alarm border-alarm hover:bg-alarm hover:text-on-primary",
};
const sizes: Record<ButtonSize, string> = {
  regular: "min-h-12 px-5.5 py-2",
  small: "min-h-touch px-5 py-1.5",
  stall: "min-h-stall px-7 py-3 text-lead",
};

/** The classes of a button or of a link that looks like one. */
export function buttonStyle(variant: ButtonVariant, size: ButtonSize, className?: string): string {
  return classes(
    "inline-flex items-center justify-center gap-2 rounded-full border-2 font-semibold leading-tight no-underline text-center",
    "aria-disabled:opacity-60 disabled:opacity-60",
    variants[variant],
    sizes[size],
    className,
  );
}
