import { useContext, useId, type ReactNode } from "react";
import { fieldIdIn, FormSurroundings, useFieldError } from "./formContext.ts";

/** What every field takes, whatever its control. */
export type FieldProps = {
  name: string;
  label: ReactNode;
  hint?: ReactNode;
  /** Overrides the message found in the surrounding Form. */
  error?: string | undefined;
  /** Shows "(optional)" beside the label. */
  optional?: boolean | undefined;
  /** Keeps the label for screen readers only; for fields in tables. */
  hideLabel?: boolean | undefined;
  className?: string | undefined;
};

/** The attributes a control must carry to be wired to its label, hint and error. */
export type ControlProps = {
  id: string;
  "aria-describedby": string | undefined;
  "aria-invalid": true | undefined;
};

export const controlStyle =
  "block w-full min-w-0 min-h-touch rounded-card border-2 border-ink-2 bg-float text-ink px-3.5 py-1.5 placeholder:text-ink-2 aria-invalid:border-alarm read-only:border-line disabled:opacity-60";

/** Wires ids: what a control needs, and where its hint and error stand. */
export function useField({ name, hint, error }: Pick<FieldProps, "name" | "hint" | "error">) {
  const surroundings = useContext(FormSurroundings);
  const ownId = useId();
  const found = useFieldError(name);
  const message = error ?? found;
  const id = surroundings ? fieldIdIn(surroundings.formId, name) : `${ownId}-${name}`;
  const hintId = hint ? `${id}-hint` : undefined;
  const errorId = message ? `${id}-error` : undefined;
  const describedBy = [hintId, errorId].filter(Boolean).join(" ") || undefined;
  const control: ControlProps = { id, "aria-describedby": describedBy, "aria-invalid": message ? true : undefined };
  return { control, message, hintId, errorId };
}

type Props = FieldProps & { children: (control: ControlProps) => ReactNode };

/** Label, hint, control and error in one, wired with ids and aria attributes; `children` draws the control. */
export function Field({ children, label, hint, optional, hideLabel, className, ...wiring }: Props) {
  const { control, message, hintId, errorId } = useField({ ...wiring, hint });
  return (
    <div className={className}>
      <label htmlFor={control.id} className={hideLabel ? "sr-only" : "mb-1 block font-semibold"}>
        {label}
        {optional && <span className="font-normal text-ink-2"> (optional)</span>}
      </label>
      {hint && (
        <p id={hintId} className="mb-1.5 text-small text-ink-2">
          {hint}
        </p>
      )}
      {children(control)}
      <FieldError id={errorId} message={message} />
    </div>
  );
}

/** The sentence under a control that says what is wrong. */
export function FieldError({ id, message }: { id: string | undefined; message: string | undefined }) {
  if (!message) return null;
  return (
    <p id={id} className="mt-1.5 text-small font-semibold text-alarm">
      <span aria-hidden="true">▲ </span>
      {message}
    </p>
  );
}
