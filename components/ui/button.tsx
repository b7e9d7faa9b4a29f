import type { AnchorHTMLAttributes, ButtonHTMLAttributes } from "react";

type Kind = "primary" | "ghost";

function buttonClass(kind: Kind, small: boolean, className = ""): string {
  return ["btn", kind === "ghost" ? "btn-ghost" : "", small ? "btn-small" : "", className].filter(Boolean).join(" ");
}

interface Look {
  kind?: Kind;
  small?: boolean;
}

export function Button({ kind = "primary", small = false, className, type = "button", ...rest }: Look & ButtonHTMLAttributes<HTMLButtonElement>) {
  return <button type={type} className={buttonClass(kind, small, className)} {...rest} />;
}

/** A link that is the page's next action. Give `href` through `localePath`. */
export function ButtonLink({ kind = "primary", small = false, className, ...rest }: Look & AnchorHTMLAttributes<HTMLAnchorElement>) {
  return <a className={buttonClass(kind, small, className)} {...rest} />;
}
