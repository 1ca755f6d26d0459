import { z } from "zod";
import { isUnit } from "@/lib/calc/units";
import { line } from "@/lib/form/text";
import { readLimits, typedLimitsShape, unitShape } from "../typed-limits";

export const MOST_ROWS = 24;
export const MOST_COLUMNS = 12;

const rowShape = z.object({
  label: z.string(),
  unit: unitShape,
  limits: typedLimitsShape,
  /** Limits of single cells, in column order; null: those of the row. */
  cells: z.array(typedLimitsShape.nullable()),
});

/** Rows × columns of readings, e.g. five rails at three points. */
export const specShape = z.object({ columns: z.array(z.string()), rows: z.array(rowShape) });
export type Spec = z.infer<typeof specShape>;

/** cells: limits of single cells as typed; empty: those of the row. */
export const typedShape = z.object({
  columns: z.array(z.string()),
  rows: z.array(z.object({ label: z.string(), unit: z.string(), limits: z.string(), cells: z.array(z.string()) })),
});
export type Typed = z.infer<typeof typedShape>;

/** Cells as typed, row by row. */
export const entryShape = z.object({ cells: z.array(z.array(z.string())) });
export type Entry = z.infer<typeof entryShape>;

const name = line(60, "Give it a name.");

export const specFromTyped = typedShape.transform((typed, context): Spec => {
  if (typed.columns.length < 1 || typed.columns.length > MOST_COLUMNS) {
    context.addIssue({ code: "custom", path: ["columns"], message: `A table has 1 to ${MOST_COLUMNS} columns.` });
    return z.NEVER;
  }
  if (typed.rows.length < 1 || typed.rows.length > MOST_ROWS) {
    context.addIssue({ code: "custom", path: ["rows"], message: `A table has 1 to ${MOST_ROWS} rows.` });
    return z.NEVER;
  }
  const columns = typed.columns.map((column, c) => readName(column, context, ["columns", c]));
  const rows = typed.rows.map((row, r) => readRow(row, columns.length, context, ["rows", r]));
  refuseTwins(columns, context, (c) => ["columns", c]);
  refuseTwins(
    rows.map((row) => row.label),
    context,
    (r) => ["rows", r, "label"],
  );
  return { columns, rows };
});

function readRow(
  row: Typed["rows"][number],
  columns: number,
  context: z.RefinementCtx,
  path: PropertyKey[],
): Spec["rows"][number] {
  const label = readName(row.label, context, [...path, "label"]);
  const unit = row.unit.trim();
  if (!isUnit(unit)) {
    context.addIssue({ code: "custom", path: [...path, "unit"], message: "Choose the unit of the row." });
    return { label, unit: "", limits: { typed: row.limits, value: { unit: "" } }, cells: [] };
  }
  const limits = readLimits(row.limits, unit, context, [...path, "limits"]);
  const cells = Array.from({ length: columns }, (_, c) => {
    const own = row.cells[c]?.trim() ?? "";
    return own === "" ? null : readLimits(own, unit, context, [...path, "cells", c]);
  });
  return { label, unit, limits, cells };
}

function readName(typed: string, context: z.RefinementCtx, path: PropertyKey[]): string {
  const parsed = name.safeParse(typed);
  if (parsed.success) return parsed.data;
  context.addIssue({ code: "custom", path, message: parsed.error.issues[0]?.message ?? "Give it a name." });
  return "";
}

/** Two rows or columns of one name could not be told apart in a report. */
function refuseTwins(names: string[], context: z.RefinementCtx, pathOf: (index: number) => PropertyKey[]) {
  names.forEach((given, index) => {
    if (given !== "" && names.indexOf(given) < index) {
      context.addIssue({ code: "custom", path: pathOf(index), message: `“${given}” is there twice.` });
    }
  });
}
