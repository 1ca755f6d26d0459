import clsx from "clsx";
import type { ReactNode } from "react";

export type DescriptionListProps = {
  items: readonly { term: ReactNode; value: ReactNode; mono?: boolean }[];
  /** "row" puts term and value on one line with a rule below, as on a data sheet; "stack" puts them under each other. */
  layout?: "row" | "stack";
  className?: string;
};

export function DescriptionList({ items, layout = "row", className }: DescriptionListProps) {
  const isRow = layout === "row";
  return (
    <dl
      className={clsx(
        "text-[0.9375rem]",
        !isRow && "grid grid-cols-[repeat(auto-fit,minmax(9rem,1fr))] gap-x-6 gap-y-3",
        className,
      )}
    >
      {items.map(({ term, value, mono }, index) => (
        <div
          key={index}
          className={clsx(
            isRow && "flex items-baseline justify-between gap-4 border-b border-rule py-1.5 last:border-b-0",
          )}
        >
          <dt className="text-sm text-ink-soft">{term}</dt>
          <dd className={clsx("min-w-0 break-words", isRow && "text-right", mono && "mono text-sm font-medium")}>
            {value}
          </dd>
        </div>
      ))}
    </dl>
  );
}
