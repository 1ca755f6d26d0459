import type { DecisionRule } from "@/db/schema/projects";
import { judge as judgeOne } from "../reading/judge";
import type { Unit } from "@/lib/calc/units";
import type { Judged } from "../kind";
import type { TypedLimits } from "../typed-limits";
import type { Entry, Spec } from "./schema";

export type CellPlace = { row: number; column: number };

export type Cell = CellPlace & {
  /** "+5 V, no load" */
  label: string;
  unit: Unit;
  limits: TypedLimits;
  typed: string;
  judged: Judged | undefined;
  value: number | undefined;
};

/** Every cell with what was typed and how it stands to its limits, row by row; without the instrument's accuracy. */
export function cellsOf(spec: Spec, entry: Entry, rule: DecisionRule): Cell[] {
  return spec.rows.flatMap((line, row) =>
    spec.columns.map((name, column) => {
      const typed = entry.cells[row]?.[column] ?? "";
      const limits = line.cells[column] ?? line.limits;
      const judged =
        typed.trim() === ""
          ? undefined
          : judgeOne(
              { unit: line.unit, limits, expected: null },
              { typed },
              { rule, instrumentRanges: [], evidence: [], note: "" },
            );
      const value = judged?.ok ? judged.readings[0]?.value : undefined;
      return {
        row,
        column,
        label: `${line.label}, ${name}`,
        unit: line.unit,
        limits,
        typed,
        judged,
        value: value !== undefined && Number.isFinite(value) ? value : undefined,
      };
    }),
  );
}

function places(spec: Spec): CellPlace[] {
  return spec.rows.flatMap((_, row) => spec.columns.map((_, column) => ({ row, column })));
}

const isOpen = (entry: Entry) => (at: CellPlace) => (entry.cells[at.row]?.[at.column] ?? "").trim() === "";

export function firstOpenCell(spec: Spec, entry: Entry): CellPlace | undefined {
  return places(spec).find(isOpen(entry));
}

/** The next empty cell after this one, going round; undefined when all others are filled. */
export function cellAfter(spec: Spec, entry: Entry, at: CellPlace): CellPlace | undefined {
  const all = places(spec);
  const here = all.findIndex((one) => one.row === at.row && one.column === at.column);
  return [...all.slice(here + 1), ...all.slice(0, here)].find(isOpen(entry));
}
