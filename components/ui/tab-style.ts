import clsx from "clsx";

export const tabRow = "flex gap-5 overflow-x-auto border-b border-rule [scrollbar-width:none]";

/** A copper trace under the tab one is on. */
export const tabLook = (isCurrent: boolean) =>
  clsx(
    "relative -mb-px flex min-h-10 shrink-0 items-center gap-1.5 whitespace-nowrap text-[0.9375rem] outline-offset-[-2px]",
    "after:absolute after:inset-x-0 after:bottom-0 after:h-[3px]",
    isCurrent ? "font-semibold text-ink after:bg-copper" : "text-ink-soft hover:text-ink hover:after:bg-rule-strong",
  );
