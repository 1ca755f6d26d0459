"use client";

import clsx from "clsx";
import type { RowData } from "@tanstack/react-table";
import type { ReactNode } from "react";
import { Pagination } from "./Pagination";
import { SearchField } from "./SearchField";
import type { TableColumn, TableView } from "./table-column";
import { TableHead } from "./TableHead";
import { useTableModel } from "./useTableModel";

export type TableProps<Row extends RowData> = {
  /** Accessible name: what the rows are. */
  label: string;
  columns: readonly TableColumn<Row>[];
  rows: readonly Row[];
  rowKey: (row: Row) => string;
  /** Stands instead of the table when there are no rows at all. */
  empty: ReactNode;
  /** One row as a card, below 640 px. Without it the table scrolls sideways there. */
  phone?: (row: Row) => ReactNode;
  pageSize?: number;
  /** Placeholder of the search field; without it there is none. */
  search?: string;
  /** Further filters beside the search field. */
  toolbar?: ReactNode;
  initialView?: Partial<TableView>;
  view?: TableView;
  onViewChange?: (view: TableView) => void;
  total?: number;
  rowClassName?: (row: Row) => string | undefined;
  isDense?: boolean;
  className?: string;
};

export function Table<Row extends RowData>(props: TableProps<Row>) {
  const { label, columns, phone, isDense, pageSize = 25 } = props;
  const { rows, view, setView, found, pages } = useTableModel({ ...props, pageSize });
  if ((props.total ?? props.rows.length) === 0 && view.search === "") return <>{props.empty}</>;
  return (
    <div className={clsx("flex min-w-0 flex-col gap-3", props.className)}>
      {(props.search || props.toolbar) && (
        <div className="flex flex-wrap items-end gap-2.5 print:hidden">
          {props.search && (
            <SearchField
              label={props.search}
              value={view.search}
              onChange={(search) => setView({ search })}
              className="min-w-0 flex-1 basis-56 sm:max-w-80"
            />
          )}
          {props.toolbar}
        </div>
      )}
      <p role="status" className="sr-only">
        {view.search ? `${found} found` : ""}
      </p>
      {found === 0 && (
        <p className="rounded border border-dashed border-rule-strong px-4 py-5 text-ink-soft">
          Nothing matches “{view.search}”.
        </p>
      )}
      {phone && rows.length > 0 && (
        <ul aria-label={label} className="flex flex-col gap-2.5 sm:hidden">
          {rows.map((row) => (
            <li key={row.id}>{phone(row.original)}</li>
          ))}
        </ul>
      )}
      {rows.length > 0 && (
        <div
          className={clsx("min-w-0 overflow-x-auto sm:overflow-visible", phone && "max-sm:hidden")}
          {...(phone ? {} : { tabIndex: 0, role: "group", "aria-label": `${label}, scrolls sideways` })}
        >
          <table aria-label={label} className="w-full border-collapse text-left text-[0.9375rem]">
            <TableHead columns={columns} view={view} onSort={setView} />
            <tbody>
              {rows.map((row) => (
                <tr
                  key={row.id}
                  className={clsx(
                    "border-b border-rule last:border-b-0 hover:bg-raised",
                    props.rowClassName?.(row.original),
                  )}
                >
                  {columns.map((column) => (
                    <Cell key={column.id} column={column} row={row.original} isDense={isDense} />
                  ))}
                </tr>
              ))}
            </tbody>
          </table>
        </div>
      )}
      {pages > 1 && (
        <Pagination page={view.page} pages={pages} onPage={(page) => setView({ page })} note={`${found} in all`} />
      )}
    </div>
  );
}

type CellProps<Row extends RowData> = { column: TableColumn<Row>; row: Row; isDense: boolean | undefined };

function Cell<Row extends RowData>({ column, row, isDense }: CellProps<Row>) {
  const className = clsx(
    "px-3 align-middle first:pl-1 last:pr-1",
    isDense ? "py-1.5" : "py-2.5",
    column.align === "end" && "text-right",
    column.mono && "mono text-sm",
    column.className,
  );
  return column.isRowHeader ? (
    <th scope="row" className={clsx(className, "font-semibold")}>
      {column.cell(row)}
    </th>
  ) : (
    <td className={className}>{column.cell(row)}</td>
  );
}
