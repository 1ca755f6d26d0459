import clsx from "clsx";
import { Icon } from "./Icon";
import type { TableColumn, TableView } from "./table-column";

type TableHeadProps<Row> = {
  columns: readonly TableColumn<Row>[];
  view: TableView;
  onSort: (change: Pick<TableView, "sort" | "isDescending">) => void;
};

/** Stays at the top while the rows go by. Pressing a head sorts up, then down, then as it was. */
export function TableHead<Row>({ columns, view, onSort }: TableHeadProps<Row>) {
  const press = (id: string) => {
    if (view.sort !== id) onSort({ sort: id, isDescending: false });
    else if (!view.isDescending) onSort({ sort: id, isDescending: true });
    else onSort({ sort: null, isDescending: false });
  };
  return (
    <thead>
      <tr>
        {columns.map((column) => {
          const isSorted = view.sort === column.id;
          return (
            <th
              key={column.id}
              scope="col"
              style={column.width ? { width: column.width } : undefined}
              aria-sort={isSorted ? (view.isDescending ? "descending" : "ascending") : undefined}
              className={clsx(
                "sticky top-0 z-10 whitespace-nowrap bg-sheet px-3 py-1 text-sm font-semibold text-ink-soft first:pl-1 last:pr-1",
                "shadow-[inset_0_-1px_0_var(--rule-strong)]",
                column.align === "end" && "text-right",
              )}
            >
              {column.sortBy ? (
                <button
                  type="button"
                  onClick={() => press(column.id)}
                  className={clsx(
                    "group inline-flex min-h-8 items-center gap-1.5 rounded hover:text-ink",
                    isSorted && "text-ink",
                    column.align === "end" && "flex-row-reverse",
                  )}
                >
                  {column.header}
                  <Icon
                    name={isSorted ? (view.isDescending ? "descending" : "ascending") : "sort"}
                    size={12}
                    className={isSorted ? "text-copper" : "opacity-45 group-hover:opacity-100"}
                  />
                </button>
              ) : (
                <span className={column.isHeaderHidden ? "sr-only" : "inline-flex min-h-8 items-center"}>
                  {column.header}
                </span>
              )}
            </th>
          );
        })}
      </tr>
    </thead>
  );
}
