import clsx from "clsx";
import type { DrawnColumn, RowShape } from "./grid-columns";

export const HEAD_HEIGHT = 36;

export function GridHead({ columns, shape }: { columns: readonly DrawnColumn[]; shape: RowShape }) {
  return (
    <div
      role="row"
      aria-rowindex={1}
      className="sticky top-0 z-[5] grid border-b border-rule-strong bg-sheet"
      style={{ ...shape, height: HEAD_HEIGHT }}
    >
      {columns.map(({ id, heading }, index) => (
        <div
          key={id}
          role="columnheader"
          aria-colindex={index + 1}
          className={clsx(
            "flex items-center bg-sheet px-2 text-xs font-semibold text-ink-soft",
            id === "pin" && "sticky left-0 z-[1]",
            (id === "loads" || id === "pullUpOhm") && "justify-end",
          )}
        >
          {heading}
        </div>
      ))}
    </div>
  );
}
