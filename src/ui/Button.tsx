import type { ComponentProps, MouseEvent } from "react";
import { buttonStyle, type ButtonSize, type ButtonVariant } from "./buttonStyle.ts";

type Props = ComponentProps<"button"> & {
  variant?: ButtonVariant | undefined;
  size?: ButtonSize | undefined;
  /** Words shown instead of the label while the work goes on ("Saving"); further presses do nothing. */
  pending?: string | false | undefined;
};

/** A button; while pending it says so and keeps its focus, but does not act again. */
export function Button({
  variant = "primary",
  size = "regular",
  pending,
  className,
  children,
  onClick,
  ...rest
}: Props) {
  const press = (event: MouseEvent<HTMLButtonElement>) => {
    if (pending) event.preventDefault();
    else onClick?.(event);
  };
  return (
    <button
      type="button"
      {...rest}
      onClick={press}
      aria-disabled={pending ? true : undefined}
      className={buttonStyle(variant, size, className)}
    >
      {pending ? <span role="status">{pending}…</span> : children}
    </button>
  );
}
