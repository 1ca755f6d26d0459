import Link from "next/link";
import type { ComponentProps } from "react";
import { buttonStyle, type ButtonKind, type ButtonSize } from "./button-style";

export type ButtonLinkProps = ComponentProps<typeof Link> & { kind?: ButtonKind; size?: ButtonSize };

/** Goes somewhere, so it is a link; it only looks like a button. */
export function ButtonLink({ kind, size, className, ...rest }: ButtonLinkProps) {
  return <Link {...rest} className={buttonStyle(kind, size, className)} />;
}
