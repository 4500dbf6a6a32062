import type { ComponentProps } from "react";
import { FieldError, useField, type FieldProps } from "./Field.tsx";

type Props = Omit<FieldProps, "hideLabel" | "optional"> &
  Omit<ComponentProps<"input">, keyof FieldProps | "id" | "type">;

/** One tick box with its label beside it; the whole row is the target. */
export function CheckField({ name, label, hint, error, className, ...input }: Props) {
  const { control, message, hintId, errorId } = useField({ name, hint, error });
  return (
    <div className={className}>
      <label className="flex min-h-touch items-center gap-3 py-1.5">
        <input {...input} {...control} type="checkbox" name={name} className="size-6 shrink-0 accent-water-deep" />
        <span>{label}</span>
      </label>
      {hint && (
        <p id={hintId} className="ml-9 text-small text-ink-2">
          {hint}
        </p>
      )}
      <FieldError id={errorId} message={message} />
    </div>
  );
}
