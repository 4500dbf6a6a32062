import type { ComponentProps } from "react";
import { controlStyle, Field, type FieldProps } from "./Field.tsx";

type Props = FieldProps & Omit<ComponentProps<"textarea">, keyof FieldProps | "id">;

/** A text box of several lines; grows with what is typed where the browser can. */
export function TextArea({ name, label, hint, error, optional, hideLabel, className, rows = 4, ...area }: Props) {
  return (
    <Field {...{ name, label, hint, error, optional, hideLabel, className }}>
      {(control) => (
        <textarea rows={rows} {...area} {...control} name={name} className={`${controlStyle} field-sizing-content`} />
      )}
    </Field>
  );
}
