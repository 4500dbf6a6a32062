import { useState, type ReactNode } from "react";
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
export function Stepper(props: Props) {
  const { label, value, onChange, min = 0, max = 999, disabled = false, size = "regular", className } = props;
  const set = (next: number) => {
    const kept = Math.min(max, Math.max(min, next));
    if (kept !== value) onChange(kept);
  };
  const atMost = value >= max;
  return (
    <div
      role="group"
      aria-label={label}
      className={classes("inline-flex items-center rounded-full bg-float font-semibold", className)}
    >
      <StepButton
        words={`One ${label} less`}
        size={size}
        blocked={disabled || value <= min}
        onPress={() => set(value - 1)}
      >
        <Minus aria-hidden="true" />
      </StepButton>
      <TypedCount label={label} value={value} disabled={disabled} onCount={set} />
      <StepButton words={`One ${label} more`} size={size} blocked={disabled || atMost} onPress={() => set(value + 1)}>
        <Plus aria-hidden="true" />
      </StepButton>
      <span aria-live="polite" className="sr-only">
        {value} {label}
        {atMost && !disabled && ", no more left"}
      </span>
    </div>
  );
}

type StepProps = {
  words: string;
  size: "regular" | "stall";
  blocked: boolean;
  onPress: () => void;
  children: ReactNode;
};

/** Blocked, it keeps its focus, so that a thumb or a screen reader does not lose its place at the limit. */
function StepButton({ words, size, blocked, onPress, children }: StepProps) {
  return (
    <button
      type="button"
      aria-disabled={blocked || undefined}
      onClick={() => !blocked && onPress()}
      className={classes(
        "grid shrink-0 place-items-center rounded-full text-water-deep hover:bg-water aria-disabled:text-ink-2 aria-disabled:opacity-50",
        size === "stall" ? "size-stall" : "size-touch",
      )}
    >
      {children}
      <span className="sr-only">{words}</span>
    </button>
  );
}

type CountProps = { label: string; value: number; disabled: boolean; onCount: (count: number) => void };

/** The figure itself: what is typed counts once Enter is pressed or the field is left. */
function TypedCount({ label, value, disabled, onCount }: CountProps) {
  const [typed, setTyped] = useState<string | null>(null);
  const settle = () => {
    if (typed !== null && /^\d+$/.test(typed)) onCount(Number(typed));
    setTyped(null);
  };
  return (
    <input
      aria-label={`How many ${label}`}
      className="num min-h-touch w-9 rounded-full bg-transparent text-center"
      inputMode="numeric"
      autoComplete="off"
      maxLength={4}
      disabled={disabled}
      value={typed ?? value}
      onFocus={(event) => event.target.select()}
      onChange={(event) => setTyped(event.target.value)}
      onBlur={settle}
      onKeyDown={(event) => {
        if (event.key !== "Enter") return;
        event.preventDefault();
        settle();
      }}
    />
  );
}
