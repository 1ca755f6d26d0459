import clsx from "clsx";
import type { ReactNode } from "react";
import { TONES, type Tone } from "./tone";

/** A word about a thing: a role, "hold point", "draft". States of a check are drawn by StateWord instead. */
export function Badge({
  tone = "plain",
  children,
  className,
}: {
  tone?: Tone;
  children: ReactNode;
  className?: string;
}) {
  return (
    <span
      className={clsx(
        "inline-flex items-center gap-1 whitespace-nowrap rounded-sm border px-1.5 text-xs font-semibold leading-5",
        TONES[tone].badge,
        className,
      )}
    >
      {children}
    </span>
  );
}
