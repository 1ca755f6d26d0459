import clsx from "clsx";
import type { ReactNode } from "react";

/** The last row of a dialog or form: the main action first for the thumb on a phone, last on a desktop. */
export function DialogActions({ children, className }: { children: ReactNode; className?: string }) {
  return (
    <div
      className={clsx("mt-5 flex flex-col-reverse gap-2 *:w-full sm:flex-row sm:justify-end sm:*:w-auto", className)}
    >
      {children}
    </div>
  );
}
