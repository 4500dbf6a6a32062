import { Link, type LinkProps } from "react-router-dom";
import { buttonStyle, type ButtonSize, type ButtonVariant } from "./buttonStyle.ts";

type Props = LinkProps & { variant?: ButtonVariant | undefined; size?: ButtonSize | undefined };

/** A link that looks like a button: it goes somewhere, it does not change anything. */
export function ButtonLink({ variant = "primary", size = "regular", className, ...rest }: Props) {
  return <Link {...rest} className={buttonStyle(variant, size, className)} />;
}
