import type { ButtonHTMLAttributes, Ref } from "react";

export type ButtonLook = "outline" | "primary" | "quiet";
export const buttonClass = (look: ButtonLook, className = ""): string =>
  `button ${look === "outline" ? "" : `button-${look}`} ${className}`.trim();

type Props = ButtonHTMLAttributes<HTMLButtonElement> & { look?: ButtonLook; ref?: Ref<HTMLButtonElement> };

/** A button; `primary` for the one action of a screen, `quiet` for what stands in a sentence. 44 px high on touch. */
export function Button({ look = "outline", type = "button", className, ...rest }: Props) {
  return <button type={type} className={buttonClass(look, className)} {...rest} />;
}
