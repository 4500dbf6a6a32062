import { classes } from "./classes.ts";

type Props = {
  /** What ticking it means: "Ines Okafor collected". */ label: string;
  checked: boolean;
  onChange: (checked: boolean) => void;
  disabled?: boolean | undefined;
};

/** The stall's big round tick: 60 px, filled when done, pressed again to undo. */
export function TickButton({ label, checked, onChange, disabled }: Props) {
  return (
    <button
      type="button"
      aria-pressed={checked}
      disabled={disabled}
      onClick={() => onChange(!checked)}
      className={classes(
        "grid size-stall shrink-0 place-items-center rounded-full border-3",
        checked ? "border-leaf bg-leaf text-on-primary" : "border-ink-2",
      )}
    >
      <span className="sr-only">{label}</span>
      {checked && (
        <svg
          viewBox="0 0 32 32"
          className="size-8"
          fill="none"
          stroke="currentColor"
          strokeWidth="4"
          strokeLinecap="round"
          strokeLinejoin="round"
          aria-hidden="true"
        >
          <path className="tick" pathLength="1" d="M6 17l7 7 13-15" />
        </svg>
      )}
    </button>
  );
}
