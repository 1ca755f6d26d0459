import clsx from "clsx";
import type { ReactNode } from "react";

export type EmptyStateProps = {
  title: string;
  /** What goes here and how it gets here. */
  children: ReactNode;
  action?: ReactNode;
  drawing?: ReactNode;
  className?: string;
};

/** An empty slot: the outline of what will stand here. */
export function EmptyState({ title, children, action, drawing, className }: EmptyStateProps) {
  return (
    <div
      className={clsx(
        "flex flex-col items-start gap-3 rounded-lg border border-dashed border-rule-strong px-5 py-6 sm:flex-row sm:gap-5",
        className,
      )}
    >
      {drawing && <div className="text-ink-faint">{drawing}</div>}
      <div className="flex max-w-prose flex-col gap-1">
        <p className="font-head text-lg font-semibold leading-tight">{title}</p>
        <div className="text-[0.9375rem] text-ink-soft">{children}</div>
        {action && <div className="mt-3 flex flex-wrap gap-2">{action}</div>}
      </div>
    </div>
  );
}
