import type { ComponentProps, ReactNode } from "react";
import { classes } from "./classes.ts";
import { FieldError, useField, type FieldProps } from "./Field.tsx";

export type RadioOption = { value: string; label: ReactNode; hint?: ReactNode; disabled?: boolean | undefined };
type Props = Omit<FieldProps, "optional"> &
  Omit<ComponentProps<"input">, keyof FieldProps | "id" | "type" | "value"> & { options: RadioOption[] };

/** A few choices of which one holds; each is a row of at least 44 px. Takes what register gives. */
export function RadioGroup({ name, label, hint, error, hideLabel, className, options, ...input }: Props) {
  const { control, message, hintId, errorId } = useField({ name, hint, error });
  return (
    <fieldset className={className} aria-describedby={control["aria-describedby"]}>
      <legend className={hideLabel ? "sr-only" : "mb-1"}>{label}</legend>
      {hint && (
        <p id={hintId} className="mb-1.5 text-small text-ink-2">
          {hint}
        </p>
      )}
      <div className="grid gap-2">
        {options.map((option, index) => (
          <label
            key={option.value}
            className={classes(
              "flex min-h-touch items-start gap-3 rounded-card border-2 border-line px-3.5 py-2.5 has-checked:border-water-deep has-checked:bg-water",
              option.disabled && "opacity-60",
            )}
          >
            <input
              {...input}
              type="radio"
              name={name}
              value={option.value}
              disabled={option.disabled}
              id={index === 0 ? control.id : undefined}
              className="mt-0.5 size-5.5 shrink-0 accent-water-deep"
            />
            <span>
              {option.label}
              {option.hint && <span className="block text-small text-ink-2">{option.hint}</span>}
            </span>
          </label>
        ))}
      </div>
      <FieldError id={errorId} message={message} />
    </fieldset>
  );
}
