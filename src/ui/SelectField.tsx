import type { ComponentProps } from "react";
import { controlStyle, Field, type FieldProps } from "./Field.tsx";

export type Option = { value: string; label: string; disabled?: boolean | undefined };
type Props = FieldProps & Omit<ComponentProps<"select">, keyof FieldProps | "id"> & { options: Option[] };

/** A native choice of one from a list too long for radio buttons. */
export function SelectField({ name, label, hint, error, optional, hideLabel, className, options, ...select }: Props) {
  return (
    <Field {...{ name, label, hint, error, optional, hideLabel, className }}>
      {(control) => (
        <select {...select} {...control} name={name} className={controlStyle}>
          {options.map((option) => (
            <option key={option.value} value={option.value} disabled={option.disabled}>
              {option.label}
            </option>
          ))}
        </select>
      )}
    </Field>
  );
}
