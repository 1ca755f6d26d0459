import clsx from "clsx";
import type { ReactNode } from "react";

/** A key as it is printed on the keyboard. */
export function Kbd({ children, className }: { children: ReactNode; className?: string }) {
  return (
    <kbd
      className={clsx(
        "mono inline-flex min-w-5 items-center justify-center rounded-sm border border-b-2 border-rule-strong bg-raised px-1 text-2xs leading-4 text-ink-soft",
        className,
      )}
    >
      {children}
    </kbd>
  );
}
