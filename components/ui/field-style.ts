import clsx from "clsx";

/** The one look of everything one types into or picks from. */
export const control = clsx(
  "w-full min-w-0 rounded-md border border-edge bg-raised text-base text-ink shadow-none transition-colors duration-100",
  "hover:border-ink-soft data-invalid:border-failed data-invalid:bg-failed-ground/40",
  "data-disabled:border-rule-strong data-disabled:bg-transparent data-disabled:text-ink-faint",
  "[&[readonly]]:bg-transparent [&[readonly]]:border-rule-strong",
);

export const inputBox = clsx(control, "min-h-10 px-3 py-1.5");

export const fieldLabel = "text-sm font-semibold text-ink";

/** A list that drops down: menu, select, combo box. */
export const dropList =
  "motion-appear min-w-(--trigger-width) max-w-[calc(100vw-1rem)] overflow-auto rounded-md bg-raised p-1 shadow-float outline-none";

export const dropItem = clsx(
  "relative flex min-h-9 cursor-pointer items-center gap-2 rounded px-2.5 py-1.5 text-[0.9375rem] leading-snug text-ink outline-none",
  "data-focused:bg-copper-ground data-hovered:bg-copper-ground data-disabled:cursor-not-allowed data-disabled:text-ink-faint",
);
