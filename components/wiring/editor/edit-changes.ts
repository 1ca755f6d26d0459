import type { Edit } from "@/lib/calc/interconnect";
import { PIN_COLUMNS, type PinColumn, type PinTexts } from "@/lib/pin-map/pin-columns";
import { writeOhm } from "@/lib/pin-map/read-cell";
import type { CellChange } from "../grid/table-text";

type PinEdit = Extract<Edit, { kind: "pin" }>;
type Set = PinEdit["set"];

/** The edits of a finding as changes of cells, to be undone and saved like what was typed. */
export function changesOfEdits(
  edits: readonly Edit[],
  textsOf: (connectorId: string, pin: string) => PinTexts,
): CellChange[] {
  return edits.flatMap((edit) => {
    if (edit.kind !== "pin") return [];
    const { connectorId, pin, set } = edit;
    const before = textsOf(connectorId, pin);
    return PIN_COLUMNS.flatMap((column): CellChange[] => {
      const after = textOf(column, set);
      return after === undefined || after === before[column]
        ? []
        : [{ connectorId, pin, column, before: before[column], after }];
    });
  });
}

function textOf(column: PinColumn, set: Set): string | undefined {
  if (column === "note") return undefined;
  if (column === "loads") return set.loads === undefined ? undefined : set.loads === 0 ? "" : String(set.loads);
  if (column === "pullUpOhm") {
    return set.pullUpOhm === undefined ? undefined : set.pullUpOhm === null ? "" : writeOhm(set.pullUpOhm);
  }
  return set[column];
}

/** Whether the pin maps alone can do what the mend says. */
export const canBeDoneHere = (edits: readonly Edit[]): boolean =>
  edits.length > 0 && edits.every(({ kind }) => kind === "pin");
