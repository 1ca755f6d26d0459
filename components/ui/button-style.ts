import clsx from "clsx";

export type ButtonKind = "primary" | "plain" | "quiet" | "danger" | "passed" | "failed";
export type ButtonSize = "sm" | "md" | "lg" | "bench";

const KINDS: Record<ButtonKind, string> = {
  primary: "border-transparent bg-copper text-on-copper hover:bg-copper-deep",
  plain: "border-edge bg-raised text-ink hover:border-ink-soft hover:bg-sheet",
  quiet: "border-transparent bg-transparent text-ink hover:bg-ink/8",
  danger: "border-failed bg-raised text-failed hover:bg-failed-ground",
  passed: "border-transparent bg-passed text-on-state hover:brightness-92",
  failed: "border-failed bg-raised text-failed hover:bg-failed-ground",
};

/** Heights are touch targets: 32 in dense tables, 40 in forms, 48 for the one thing to do, 64 with flux on the fingers. */
const SIZES: Record<ButtonSize, string> = {
  sm: "min-h-8 gap-1.5 px-2.5 text-sm",
  md: "min-h-10 gap-2 px-3.5 text-[0.9375rem]",
  lg: "min-h-12 gap-2 px-5 text-base",
  bench: "min-h-16 gap-2.5 px-4 text-lg",
};

export function buttonStyle(kind: ButtonKind = "plain", size: ButtonSize = "md", more?: string): string {
  return clsx(
    "relative inline-flex select-none items-center justify-center rounded-md border text-center font-text font-semibold leading-tight no-underline",
    // Only under the pointer: a button that becomes possible must be readable at once, not on its way there.
    "duration-100 hover:transition-[background-color,border-color,filter] active:translate-y-px",
    "data-disabled:cursor-not-allowed data-disabled:border-rule-strong data-disabled:bg-transparent data-disabled:text-ink-faint data-disabled:active:translate-y-0",
    KINDS[kind],
    SIZES[size],
    more,
  );
}
