import type { DesignPin } from "@/lib/calc/interconnect";
import { COLUMN_NAMES, type PinColumn, type PinTexts } from "./pin-columns";
import { impliedRole } from "./pin-role";
import { READERS, writeOhm, type KnownNames, type ReadCell } from "./read-cell";

/** What is kept of one pin. */
export type PinValues = DesignPin & { note: string };

/** "a4, Role: “outputt” is no role. …" */
export type CellProblem = { pin: string; column: PinColumn; sentence: string };

export type ReadRow = { ok: true; value: PinValues } | { ok: false; problems: CellProblem[] };

/** Reads one row as it stands in the cells of a table, a paste or a file. An empty role is what the signal implies. */
export function readPinRow(pin: string, texts: PinTexts, known: KnownNames): ReadRow {
  const problems: CellProblem[] = [];
  const take = <Value>(column: PinColumn, read: ReadCell<Value>): Value | undefined => {
    if (read.ok) return read.value;
    problems.push({ pin, column, sentence: `${pin}, ${COLUMN_NAMES[column]}: ${read.sentence}` });
    return undefined;
  };
  const signal = take("signal", READERS.signal(texts.signal.trim())) ?? "";
  const role = take("role", READERS.role(texts.role.trim())) ?? impliedRole(signal, known.rails);
  const value: PinValues = {
    pin,
    signal,
    role,
    family: take("family", READERS.family(texts.family.trim(), known)) ?? "",
    loads: take("loads", READERS.loads(texts.loads.trim())) ?? 0,
    enableGroup: take("enableGroup", READERS.enableGroup(texts.enableGroup.trim())) ?? "",
    pullUpOhm: take("pullUpOhm", READERS.pullUpOhm(texts.pullUpOhm.trim())) ?? null,
    note: take("note", READERS.note(texts.note.trim())) ?? "",
  };
  return problems.length > 0 ? { ok: false, problems } : { ok: true, value };
}

/** The texts that stand for what is kept; readPinRow reads them back the same. */
export function pinTexts({ signal, role, family, loads, enableGroup, pullUpOhm, note }: PinValues): PinTexts {
  return {
    ...{ signal, role, family, enableGroup, note },
    loads: loads === 0 ? "" : String(loads),
    pullUpOhm: pullUpOhm === null ? "" : writeOhm(pullUpOhm),
  };
}
