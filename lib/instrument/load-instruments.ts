import { database } from "@/db/client";
import { listInstruments } from "@/db/queries/instruments";
import type { InstrumentKind, InstrumentRange } from "@/db/schema/people";
import type { OwnScope } from "@/lib/access/scope";
import { formatQuantity, isUnit } from "@/lib/calc/units";
import type { TypedRange } from "./range-schema";

export type InstrumentLine = {
  id: string;
  name: string;
  kind: InstrumentKind;
  calibrationNote: string;
  ranges: InstrumentRange[];
  /** The ranges as a form shows them. */
  typedRanges: TypedRange[];
  isArchived: boolean;
};

export async function loadInstruments(scope: OwnScope): Promise<InstrumentLine[]> {
  const rows = await listInstruments(database(), scope.viewer.userId);
  return rows.map((row) => ({
    id: row.id,
    name: row.name,
    kind: row.kind,
    calibrationNote: row.calibrationNote,
    ranges: row.ranges,
    typedRanges: row.ranges.map(typed),
    isArchived: row.archivedAt !== null,
  }));
}

function typed(range: InstrumentRange): TypedRange {
  const quantity = (value: number) =>
    isUnit(range.unit)
      ? formatQuantity({ value, unit: range.unit }, { significant: 15 })
          .replace(/(\.\d*?)0+(?=\D|$)/, "$1")
          .replace(/\.(?=\D|$)/, "")
      : String(value);
  return {
    unit: range.unit,
    fullScale: quantity(range.fullScale),
    resolution: quantity(range.resolution),
    percentOfReading: String(range.percentOfReading),
    counts: String(range.counts),
    percentOfRange: String(range.percentOfRange),
  };
}
