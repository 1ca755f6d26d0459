import clsx from "clsx";
import type { ComponentProps } from "react";

type Kind = "passed" | "failed" | "plain" | "primary" | "quiet";

const KINDS: Record<Kind, string> = {
  passed: "border-transparent bg-passed text-on-state hover:brightness-95",
  failed: "border-failed bg-raised text-failed hover:bg-failed-ground",
  primary: "border-transparent bg-copper text-on-copper hover:bg-copper-deep",
  plain: "border-edge bg-raised text-ink hover:border-ink-soft",
  quiet: "border-transparent bg-transparent text-ink hover:bg-copper-ground",
};

type Props = ComponentProps<"button"> & { kind?: Kind; size?: "bench" | "md" };

/** A native button at bench size: 64 px for a thumb with flux on it. Native, because every kilobyte here goes over a shed's Wi-Fi. */
export function BenchButton({ kind = "plain", size = "bench", className, ...rest }: Props) {
  return (
    <button
      type="button"
      {...rest}
      className={clsx(
        "inline-flex touch-manipulation items-center justify-center gap-2 rounded-md border text-center leading-tight font-semibold select-none active:translate-y-px",
        "disabled:border-rule-strong disabled:text-ink-faint disabled:bg-transparent disabled:active:translate-y-0",
        size === "bench" ? "min-h-16 px-3 text-lg" : "min-h-11 px-3.5 text-base",
        KINDS[kind],
        className,
      )}
    />
  );
}
