"use client";

import {
  columnFilteringFeature,
  createFilteredRowModel,
  createPaginatedRowModel,
  createSortedRowModel,
  globalFilteringFeature,
  rowPaginationFeature,
  rowSortingFeature,
  sortFn_alphanumeric,
  sortFn_basic,
  tableFeatures,
  useTable,
  type ColumnDef,
  type RowData,
} from "@tanstack/react-table";
import { useMemo, useState } from "react";
import { FIRST_VIEW, type TableColumn, type TableView } from "./table-column";

const features = tableFeatures({
  columnFilteringFeature,
  globalFilteringFeature,
  rowSortingFeature,
  rowPaginationFeature,
  filteredRowModel: createFilteredRowModel(),
  sortedRowModel: createSortedRowModel(),
  paginatedRowModel: createPaginatedRowModel(),
  sortFns: { alphanumeric: sortFn_alphanumeric, basic: sortFn_basic },
});

type Wanted<Row extends RowData> = {
  columns: readonly TableColumn<Row>[];
  rows: readonly Row[];
  rowKey: (row: Row) => string;
  pageSize: number;
  view?: TableView | undefined;
  onViewChange?: ((view: TableView) => void) | undefined;
  initialView?: Partial<TableView> | undefined;
  /** Rows there are in all, when `rows` is only the page that the server chose for `view`. */
  total?: number | undefined;
};

/** Sorting, search and pages of one table, on the client or (with `total`) left to the server. */
export function useTableModel<Row extends RowData>(wanted: Wanted<Row>) {
  const { columns, rows, rowKey, pageSize, total } = wanted;
  const [own, setOwn] = useState<TableView>({ ...FIRST_VIEW, ...wanted.initialView });
  const view = wanted.view ?? own;
  const setView = (change: Partial<TableView>) => {
    const next = { ...view, page: 1, ...change };
    setOwn(next);
    wanted.onViewChange?.(next);
  };

  const search = (row: Row) =>
    columns
      .map((column) => textOf(column, row))
      .join("\n")
      .toLocaleLowerCase();
  const definitions = useMemo(() => columns.map((column) => define(column)), [columns]);
  const data = useMemo(() => [...rows], [rows]);
  const isRemote = total !== undefined;

  const table = useTable({
    features,
    columns: definitions,
    data,
    getRowId: rowKey,
    state: {
      sorting: view.sort ? [{ id: view.sort, desc: view.isDescending }] : [],
      globalFilter: view.search,
      pagination: { pageIndex: view.page - 1, pageSize },
    },
    globalFilterFn: (row, _column, wantedText) => matches(search(row.original), String(wantedText)),
    getColumnCanGlobalFilter: (column) => column.id === columns[0]?.id,
    autoResetPageIndex: false,
    manualFiltering: isRemote,
    manualSorting: isRemote,
    manualPagination: isRemote,
  });

  const found = isRemote ? total : table.getFilteredRowModel().rows.length;
  return { rows: table.getRowModel().rows, view, setView, found, pages: Math.max(1, Math.ceil(found / pageSize)) };
}

function define<Row extends RowData>(column: TableColumn<Row>): ColumnDef<typeof features, Row> {
  return {
    id: column.id,
    accessorFn: (row) => column.sortBy?.(row) ?? undefined,
    enableSorting: Boolean(column.sortBy),
    sortFn: (one, other, id) => {
      const isText = typeof one.getValue(id) === "string";
      return (isText ? sortFn_alphanumeric : sortFn_basic)(one, other, id);
    },
    sortUndefined: "last",
  };
}

function textOf<Row extends RowData>(column: TableColumn<Row>, row: Row): string {
  if (column.searchIn) return column.searchIn(row);
  const value = column.sortBy?.(row);
  return typeof value === "string" || typeof value === "number" ? String(value) : "";
}

const matches = (text: string, wanted: string) =>
  wanted
    .toLocaleLowerCase()
    .split(/\s+/)
    .every((word) => text.includes(word));
