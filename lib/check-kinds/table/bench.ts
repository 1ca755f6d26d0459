import { defineBenchKind } from "../bench-kind";
import { BenchForm } from "./BenchForm";
import { isEntry } from "./entry";
import { judge } from "./judge";
import type { Entry, Spec } from "./schema";
import { summary } from "./summary";

export const tableOnBench = defineBenchKind<Spec, Entry>({
  measured: true,
  isEntry,
  emptyEntry: ({ columns, rows }) => ({ cells: rows.map(() => columns.map(() => "")) }),
  isBlank: (entry) => entry.cells.every((row) => row.every((cell) => cell.trim() === "")),
  judge,
  summary: (_spec, _entry, readings) => summary(readings),
  requires: () => undefined,
  units: (spec) => [...new Set(spec.rows.map((row) => row.unit))],
  expected: () => undefined,
  BenchForm,
});
