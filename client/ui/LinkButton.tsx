import { Link, type LinkProps } from "react-router-dom";
import { type ButtonLook, buttonClass } from "./Button";

/** A link that looks like a button. */
export function LinkButton({ look = "outline", className, ...rest }: LinkProps & { look?: ButtonLook }) {
  return <Link className={buttonClass(look, className)} {...rest} />;
}
