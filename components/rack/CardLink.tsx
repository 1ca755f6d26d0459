import Link from "next/link";
import type { ComponentProps } from "react";

type Props = Omit<ComponentProps<typeof Link>, "href"> & {
  /** Undefined on a drawing that only shows: then it is no link and no stop for the keyboard. */
  href: string | undefined;
};

export function CardLink({ href, className, children, ...rest }: Props) {
  if (href === undefined) return <span className={className}>{children}</span>;
  return (
    <Link href={href} className={className} {...rest}>
      {children}
    </Link>
  );
}
