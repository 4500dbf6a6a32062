import type { ComponentProps, ReactNode } from "react";
import { classes } from "./classes.ts";
import { controlStyle, Field, type FieldProps } from "./Field.tsx";

type Props = FieldProps &
  Omit<ComponentProps<"input">, keyof FieldProps | "id"> & {
    /** A unit or sign shown inside the box, before or after what is typed ("$", "heads"). */
    before?: ReactNode;
    after?: ReactNode;
    inputClassName?: string | undefined;
  };

/** A one-line text box; takes what react-hook-form's register gives. */
export function TextField({
  name,
  label,
  hint,
  error,
  optional,
  hideLabel,
  className,
  before,
  after,
  inputClassName,
  ...input
}: Props) {
  return (
    <Field {...{ name, label, hint, error, optional, hideLabel, className }}>
      {(control) => (
        <span className="relative block">
          {before && <Sign className="left-4">{before}</Sign>}
          <input
            type="text"
            {...input}
            {...control}
            name={name}
            className={classes(controlStyle, before != null && "pl-8", after != null && "pr-16", inputClassName)}
          />
          {after && <Sign className="right-4">{after}</Sign>}
        </span>
      )}
    </Field>
  );
}

function Sign({ className, children }: { className: string; children: ReactNode }) {
  return (
    <span className={classes("pointer-events-none absolute inset-y-0 grid place-items-center text-ink-2", className)}>
      {children}
    </span>
  );
}

/** A whole number in figures; use `register(name, { valueAsNumber: true })`. */
export function NumberField(props: Props) {
  return (
    <TextField
      inputMode="numeric"
      autoComplete="off"
      {...props}
      inputClassName={classes("num", props.inputClassName)}
    />
  );
}

/** A calendar day, in and out as YYYY-MM-DD. */
export function DateField(props: Props) {
  return <TextField {...props} type="date" inputClassName={classes("num", props.inputClassName)} />;
}

/** A wall-clock time, in and out as HH:MM. */
export function TimeField(props: Props) {
  return <TextField {...props} type="time" inputClassName={classes("num", props.inputClassName)} />;
}
