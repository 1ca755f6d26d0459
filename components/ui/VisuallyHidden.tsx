import type { ReactNode } from "react";

/** Only for assistive technology. */
export function VisuallyHidden({ children }: { children: ReactNode }) {
  return <span className="sr-only">{children}</span>;
}
