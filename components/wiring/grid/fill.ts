import { busNames } from "@/lib/calc/signal-names";
import { areaOf, type Area, type Selection } from "./selection";
import { changeOf, columnAt, headingAt, textAt, type CellChange, type TableText } from "./table-text";

/** What an act of editing does, or the sentence that says why it does nothing. */
export type Planned = { ok: true; changes: CellChange[]; said: string } | { ok: false; sentence: string };

const range = (from: number, to: number) => Array.from({ length: to - from + 1 }, (_, index) => from + index);
const cellsOf = ({ top, bottom, left, right }: Area) =>
  range(top, bottom).flatMap((row) => range(left, right).map((column) => [row, column] as const));

const counted = (count: number, one: string) => `${count} ${one}${count === 1 ? "" : "s"}`;
const planned = (changes: CellChange[], said: string): Planned => ({ ok: true, changes, said });

/** Empties the chosen cells. */
export function clearCells(table: TableText, selection: Selection): Planned {
  const changes = cellsOf(areaOf(selection)).flatMap(([row, column]) => changeOf(table, row, column, ""));
  return planned(changes, `${counted(changes.length, "cell")} emptied.`);
}

/** The top row of the selection into all its rows; of a single row, the row above it. */
export function fillDown(table: TableText, selection: Selection): Planned {
  const area = areaOf(selection);
  const from = area.top === area.bottom ? area.top - 1 : area.top;
  if (from < 0) return { ok: false, sentence: "There is no row above to fill from." };
  const changes = cellsOf({ ...area, top: from + 1 }).flatMap(([row, column]) =>
    changeOf(table, row, column, textAt(table, from, column)),
  );
  return planned(changes, `${counted(changes.length, "cell")} filled from ${table.labelAt(from)}.`);
}

/** One text into every chosen cell of the columns that can be typed into. */
export function fillAll(table: TableText, selection: Selection, text: string): Planned {
  const spread = spreadBus(table, selection, text);
  if (spread) return spread;
  const changes = cellsOf(areaOf(selection)).flatMap(([row, column]) => changeOf(table, row, column, text));
  return planned(changes, `${counted(changes.length, "cell")} filled.`);
}

/** What was typed into one cell: a bus range goes over the chosen rows, anything else into that cell. */
export function typeInto(table: TableText, selection: Selection, text: string): Planned {
  const { row, column } = selection.focus;
  const spread = spreadBus(table, selection, text);
  if (spread) return spread;
  return planned(changeOf(table, row, column, text), "");
}

/** Undefined when the text is no bus range for a column of signals. A range of another length changes nothing. */
export function spreadBus(table: TableText, selection: Selection, text: string): Planned | undefined {
  const names = columnAt(selection.focus.column) === "signal" ? busNames(text) : undefined;
  if (!names) return undefined;
  const { top, bottom } = areaOf(selection);
  const chosen = bottom - top + 1;
  if (names.length !== chosen) {
    const pins = chosen === 1 ? "1 pin is" : `${chosen} pins are`;
    const sentence = `${text.trim()} names ${counted(names.length, "signal")}, but ${pins} selected. Select ${counted(names.length, "pin")} and type it again; nothing was changed.`;
    return { ok: false, sentence };
  }
  const changes = names.flatMap((name, index) => changeOf(table, top + index, selection.focus.column, name));
  return planned(changes, `${names[0]} to ${names.at(-1)} stand at ${table.labelAt(top)} to ${table.labelAt(bottom)}.`);
}

/** What goes to the clipboard; with the headings when whole rows are chosen, so that a file of them says what it is. */
export function copyCells(table: TableText, selection: Selection): string[][] {
  const { top, bottom, left, right } = areaOf(selection);
  const rows = range(top, bottom).map((row) => range(left, right).map((column) => textAt(table, row, column)));
  return left === 0 && right > 0 && bottom > top ? [range(left, right).map(headingAt), ...rows] : rows;
}
