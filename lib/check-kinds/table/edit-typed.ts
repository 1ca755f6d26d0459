import type { Typed } from "./schema";

type Row = Typed["rows"][number];

const NEW_ROW = (columns: number): Row => ({
  label: "",
  unit: "V",
  limits: "",
  cells: Array.from({ length: columns }, () => ""),
});

export function withRow(typed: Typed, at: number, change: Partial<Row>): Typed {
  return { ...typed, rows: typed.rows.map((row, index) => (index === at ? { ...row, ...change } : row)) };
}

export function withCellLimits(typed: Typed, at: { row: number; column: number }, limits: string): Typed {
  const cells = typed.columns.map((_, column) =>
    column === at.column ? limits : (typed.rows[at.row]?.cells[column] ?? ""),
  );
  return withRow(typed, at.row, { cells });
}

export function renameColumn(typed: Typed, at: number, name: string): Typed {
  return { ...typed, columns: typed.columns.map((column, index) => (index === at ? name : column)) };
}

/** The new row takes the unit of the one above: rails come in volts. */
export function addRow(typed: Typed): Typed {
  const unit = typed.rows.at(-1)?.unit ?? "V";
  return { ...typed, rows: [...typed.rows, { ...NEW_ROW(typed.columns.length), unit }] };
}

export function dropRow(typed: Typed, at: number): Typed {
  return { ...typed, rows: typed.rows.filter((_, index) => index !== at) };
}

export function addColumn(typed: Typed): Typed {
  return { columns: [...typed.columns, ""], rows: typed.rows.map((row) => ({ ...row, cells: [...row.cells, ""] })) };
}

export function dropColumn(typed: Typed, at: number): Typed {
  const without = (list: string[]) => list.filter((_, index) => index !== at);
  return { columns: without(typed.columns), rows: typed.rows.map((row) => ({ ...row, cells: without(row.cells) })) };
}
