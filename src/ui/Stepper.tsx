import { useState } from "react";
import Minus from "lucide-react/icons/minus";
import Plus from "lucide-react/icons/plus";
import { classes } from "./classes.ts";

type Props = {
  /** What is counted: "Butterhead". Names the three controls. */
  label: string;
  value: number;
  onChange: (value: number) => void;
  min?: number | undefined;
  max?: number | undefined;
  disabled?: boolean | undefined;
  /** 44 px in the shop, 60 px at the stall. */
  size?: "regular" | "stall" | undefined;
  className?: string | undefined;
};

/** A count with − and + beside it that can also be typed; says its new value aloud and stops at its limits. */
export function Stepper({
  label,
  value,
  onChange,
  min = 0,
  max = 999,
  disabled = false,
  size = "regular",
  className,
}: Props) {
  const [typed, setTyped] = useState<string | null>(null);
  const set = (next: number) => {
    setTyped(null);
    const kept = Math.min(max, Math.max(min, next));
    if (kept !== value) onChange(kept);
  };
  const settle = () => {
    const number = typed === null || typed.trim() === "" ? NaN : Number(typed);
    if (Number.isInteger(number)) set(number);
    else setTyped(null);
  };
  const button = classes(
    "grid shrink-0 place-items-center rounded-full text-water-deep hover:bg-water aria-disabled:text-ink-2 aria-disabled:opacity-50",
    size === "stall" ? "size-stall" : "size-touch",
  );
  const atMin = disabled || value <= min;
  const atMax = disabled || value >= max;
  return (
    <div
      role="group"
      aria-label={label}
      className={classes("inline-flex items-center rounded-full bg-float font-semibold", className)}
    >
      <button
        type="button"
        className={button}
        aria-disabled={atMin || undefined}
        onClick={() => !atMin && set(value - 1)}
      >
        <Minus aria-hidden="true" />
        <span className="sr-only">One {label} less</span>
      </button>
      <input
        aria-label={`How many ${label}`}
        className="num min-h-touch w-9 rounded-full bg-transparent text-center"
        inputMode="numeric"
        autoComplete="off"
        disabled={disabled}
        value={typed ?? value}
        onFocus={(event) => event.target.select()}
        onChange={(event) => setTyped(event.target.value.replace(/[^\d-]/g, ""))}
        onBlur={settle}
        onKeyDown={(event) => {
          if (event.key === "Enter") {
            event.preventDefault();
            settle();
          }
        }}
      />
      <button
        type="button"
        className={button}
        aria-disabled={atMax || undefined}
        onClick={() => !atMax && set(value + 1)}
      >
        <Plus aria-hidden="true" />
        <span className="sr-only">One {label} more</span>
      </button>
      <span aria-live="polite" className="sr-only">
        {value} {label}
        {value >= max && !disabled && ", no more left"}
      </span>
    </div>
  );
}
