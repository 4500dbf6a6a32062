import { useEffect, useId, useRef, type ReactNode } from "react";
import {
  FormProvider,
  type FieldErrors,
  type FieldValues,
  type SubmitHandler,
  type UseFormReturn,
} from "react-hook-form";
import { fieldIdIn, FormSurroundings, type FormProblem } from "./formContext.ts";

type Props<In extends FieldValues, Out> = {
  /** What useForm gave. */
  form: UseFormReturn<In, unknown, Out>;
  onSubmit: SubmitHandler<Out>;
  /** What the server said to the last try; its messages show by the fields too. What was typed stays. */
  problem?: FormProblem | null | undefined;
  className?: string | undefined;
  children: ReactNode;
};

/** A form that lists its problems on top, moves focus to the first of them, and never loses what was typed. */
export function Form<In extends FieldValues, Out>({
  form,
  onSubmit,
  problem = null,
  className,
  children,
}: Props<In, Out>) {
  const formId = useId();
  const own = form.formState.submitCount > 0 ? listProblems(form.formState.errors) : [];
  return (
    <FormProvider {...form}>
      <FormSurroundings value={{ formId, problem: own.length > 0 ? null : problem }}>
        <form
          id={formId}
          method="post"
          noValidate
          className={className ?? "grid grid-cols-1 content-start gap-5"}
          onSubmit={(event) => void form.handleSubmit(onSubmit)(event)}
        >
          {own.length > 0 && <ProblemList formId={formId} title={countProblems(own.length)} problems={own} />}
          {own.length === 0 && problem && (
            <ProblemList
              formId={formId}
              title={problem.title}
              detail={problem.detail}
              problems={problem.errors ?? []}
              focusFor={problem}
            />
          )}
          {children}
        </form>
      </FormSurroundings>
    </FormProvider>
  );
}

type Problem = { field: string; message: string };

const countProblems = (count: number) => (count === 1 ? "One thing needs mending" : `${count} things need mending`);

function listProblems(errors: FieldErrors, path = ""): Problem[] {
  return Object.entries(errors).flatMap(([key, value]): Problem[] => {
    if (!value || typeof value !== "object" || key === "ref") return [];
    const field = path ? `${path}.${key}` : key;
    if (typeof value.message === "string" && value.message) return [{ field, message: value.message }];
    return listProblems(value as FieldErrors, field);
  });
}

type ListProps = {
  formId: string;
  title: string;
  detail?: string | undefined;
  problems: Problem[];
  /** Focus moves here whenever this changes. */
  focusFor?: FormProblem | undefined;
};

function ProblemList({ formId, title, detail, problems, focusFor }: ListProps) {
  const box = useRef<HTMLDivElement>(null);
  // The form's own checks already move focus to the first field; a server's answer has nowhere else to be noticed.
  useEffect(() => {
    if (focusFor) box.current?.focus();
  }, [focusFor]);
  return (
    <div ref={box} tabIndex={-1} role="alert" className="rounded-card border-2 border-alarm bg-float px-4 py-3">
      <p className="font-semibold text-alarm">{title}</p>
      {detail && <p>{detail}</p>}
      {problems.length > 0 && (
        <ul className="mt-1 list-disc pl-5">
          {problems.map(({ field, message }) => (
            <li key={field}>
              <a href={`#${fieldIdIn(formId, field)}`}>{message}</a>
            </li>
          ))}
        </ul>
      )}
    </div>
  );
}
