import { useId, type ReactNode } from "react";
import { NavLink } from "react-router-dom";
import { classes } from "./classes.ts";

type Segment<Value extends string> = { value: Value; label: ReactNode };
type Props<Value extends string> = {
  /** What is being chosen; read aloud. */
  label: string;
  options: Segment<Value>[];
  value: Value;
  onChange: (value: Value) => void;
  size?: "regular" | "stall" | undefined;
};

const track = "flex w-fit min-w-0 max-w-full flex-wrap gap-1 rounded-[1.75rem] bg-water p-1";
const segment =
  "inline-flex items-center justify-center gap-2 rounded-full px-3 md:px-4 font-semibold text-ink no-underline";

/** A few views or filters of which one holds, side by side; arrow keys move between them. */
export function Segments<Value extends string>({ label, options, value, onChange, size = "regular" }: Props<Value>) {
  const name = useId();
  return (
    <fieldset className={track}>
      <legend className="sr-only">{label}</legend>
      {options.map((option) => (
        <label
          key={option.value}
          className={classes(
            segment,
            "has-checked:bg-water-deep has-checked:text-on-primary has-focus-visible:outline-3 has-focus-visible:outline-offset-2",
            size === "stall" ? "min-h-stall" : "min-h-touch",
          )}
        >
          <input
            type="radio"
            name={name}
            className="sr-only"
            checked={option.value === value}
            onChange={() => onChange(option.value)}
          />
          {option.label}
        </label>
      ))}
    </fieldset>
  );
}

type TabLinksProps = { label: string; items: { to: string; label: ReactNode; end?: boolean | undefined }[] };

/** The same look for views that each have an address of their own. */
export function TabLinks({ label, items }: TabLinksProps) {
  return (
    <nav aria-label={label} className={track}>
      {items.map(({ to, label: words, end = false }) => (
        <NavLink
          key={to}
          to={to}
          end={end}
          className={classes(
            segment,
            "min-h-touch aria-[current=page]:bg-water-deep aria-[current=page]:text-on-primary",
          )}
        >
          {words}
        </NavLink>
      ))}
    </nav>
  );
}
