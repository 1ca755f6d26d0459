import { formatLimits } from "@/lib/calc/units";
import { defineKind } from "../define-kind";
import { judge } from "./judge";
import { RecordView } from "./RecordView";
import { entryShape, specFromTyped, specShape, typedShape, type Spec } from "./schema";
import { summary } from "./summary";

export const table = defineKind({
  name: "table",
  label: "Table of readings",
  description: "Several readings in rows and columns, e.g. every rail at three points; the worst cell decides.",
  specShape,
  typedShape,
  specFromTyped,
  emptyTyped: { columns: ["no load"], rows: [{ label: "", unit: "V", limits: "", cells: [""] }] },
  typedFromSpec: ({ columns, rows }) => ({
    columns,
    rows: rows.map((row) => ({
      label: row.label,
      unit: row.unit,
      limits: row.limits.typed,
      cells: columns.map((_, c) => row.cells[c]?.typed ?? ""),
    })),
  }),
  entryShape,
  emptyEntry: ({ columns, rows }) => ({ cells: rows.map(() => columns.map(() => "")) }),
  judge,
  expectation,
  summary: (_spec, _entry, readings) => summary(readings),
  measured: true,
  requires: () => undefined,
  RecordView,
});

/** One row shows its limits; more show how many readings there are. */
function expectation({ columns, rows }: Spec): string {
  const [only, ...rest] = rows;
  if (only && rest.length === 0) return `${only.label} ${formatLimits(only.limits.value)}`;
  return `${rows.length} × ${columns.length} readings`;
}
