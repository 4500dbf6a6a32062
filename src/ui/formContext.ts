import { createContext, useContext } from "react";
import { get, useFormContext, type UseFormReturn } from "react-hook-form";

/** What the server said about a form that passed the checks here: RFC 9457, with messages by field. */
export type FormProblem = {
  title: string;
  detail?: string | undefined;
  errors?: { field: string; message: string }[] | undefined;
};

export const FormSurroundings = createContext<{ formId: string; problem: FormProblem | null } | null>(null);

/** The message for a field by its name: first what the form's own checks say, then what the server said. */
export function useFieldError(name: string): string | undefined {
  // Outside a <Form> there is none, whatever its type says.
  const form = useFormContext() as UseFormReturn | null;
  const surroundings = useContext(FormSurroundings);
  const own: unknown = form ? get(form.formState.errors, `${name}.message`) : undefined;
  if (typeof own === "string") return own;
  return surroundings?.problem?.errors?.find((error) => error.field === name)?.message;
}

/** The id a field's control has inside the form, so that the list of problems can point at it. */
export function fieldIdIn(formId: string, name: string): string {
  return `${formId}-${name.replaceAll(".", "-")}`;
}
