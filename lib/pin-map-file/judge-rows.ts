import { busNames } from "@/lib/calc/signal-names";
import { EMPTY_TEXTS, isEmptyRow, PIN_COLUMNS, type PinTexts } from "@/lib/pin-map/pin-columns";
import type { KnownNames } from "@/lib/pin-map/read-cell";
import { pinTexts, readPinRow } from "@/lib/pin-map/read-pin-row";
import { findPins, findTarget, nameOf, type TakeTarget } from "./resolve-target";
import type { FileColumn, Mapping } from "./guess-columns";
import type { Table, TableRow } from "./split-table";

/** A row that cannot be taken, and why. */
export type BadRow = { line: number; sentence: string };

/** What the file says of one pin; texts without a word take away what it carries. */
export type FilePin = { line: number; target: TakeTarget; pin: string; texts: PinTexts };

export type Judged = {
  pins: FilePin[];
  bad: BadRow[];
  /** Rows with a word in them, headings left out. */
  rows: number;
  /** Pins that stand in the file in another case than on the connector, as written and as they are. */
  recased: { written: string; name: string }[];
};

type Asked = {
  table: Table;
  hasHeadings: boolean;
  mapping: Mapping;
  targets: readonly TakeTarget[];
  /** Null: the file says which connector each row is for. */
  chosenId: string | null;
  known: KnownNames;
};

/** Reads every row against the project: nothing is taken that a row of the editor would not take. */
export function judgeRows({ table, hasHeadings, mapping, targets, chosenId, known }: Asked): Judged {
  const rows = hasHeadings ? table.rows.slice(1) : table.rows;
  const width = hasHeadings ? (table.rows[0]?.cells.length ?? 0) : mapping.length;
  const judged: Judged = { pins: [], bad: [], rows: rows.length, recased: [] };
  const chosen = targets.find(({ id }) => id === chosenId);
  const seen = new Map<string, number>();
  for (const row of rows) {
    const read = readRow(row, { width, mapping, targets, chosen, known });
    if (!read.ok) {
      judged.bad.push({ line: row.line, sentence: read.sentence });
      continue;
    }
    const twice = read.pins.find(({ target, pin }) => seen.has(`${target.id} ${pin}`));
    if (twice) {
      const first = seen.get(`${twice.target.id} ${twice.pin}`) ?? 0;
      judged.bad.push({
        line: row.line,
        sentence: `${twice.pin} of ${nameOf(twice.target)} stands in line ${first} already.`,
      });
      continue;
    }
    for (const { target, pin } of read.pins) seen.set(`${target.id} ${pin}`, row.line);
    judged.pins.push(...read.pins);
    judged.recased.push(...read.recased);
  }
  return judged;
}

type Frame = Pick<Asked, "mapping" | "targets" | "known"> & { width: number; chosen: TakeTarget | undefined };
type ReadRow = { ok: true; pins: FilePin[]; recased: Judged["recased"] } | { ok: false; sentence: string };

function readRow({ line, cells }: TableRow, { width, mapping, targets, chosen, known }: Frame): ReadRow {
  if (cells.length > width) {
    const sentence = `It has ${cells.length} cells for ${width} columns. Perhaps a text with a separator in it stands without quotation marks.`;
    return { ok: false, sentence };
  }
  const cell = (column: FileColumn) => cells[mapping.indexOf(column)] ?? "";
  const texts = PIN_COLUMNS.reduce((all, column): PinTexts => ({ ...all, [column]: cell(column) }), EMPTY_TEXTS);
  if (cell("pin") === "") return { ok: false, sentence: "It names no pin." };
  const found = findTarget({ board: cell("board"), connector: cell("connector"), pin: cell("pin") }, targets, chosen);
  if (!found.ok) return found;
  const { target } = found;
  const unchanged = target.kept[found.pin];
  if (unchanged && sameTexts(unchanged, texts))
    return { ok: true, pins: [{ line, target, pin: found.pin, texts }], recased: [] };
  const named = findPins(target, found.pin);
  if (!named.ok) return named;
  const bus = busNames(texts.signal);
  if (bus && bus.length !== named.pins.length) {
    const where = named.pins.length === 1 ? `${found.pin} is one pin` : `${found.pin} are ${named.pins.length} pins`;
    return { ok: false, sentence: `${texts.signal} names ${bus.length} signals, but ${where}.` };
  }
  const pins: FilePin[] = [];
  for (const [at, { name }] of named.pins.entries()) {
    const own = { ...texts, signal: bus?.[at] ?? texts.signal };
    const read = isEmptyRow(own) ? undefined : readPinRow(name, own, known);
    if (read && !read.ok) return { ok: false, sentence: read.problems.map(({ sentence }) => sentence).join(" ") };
    pins.push({ line, target, pin: name, texts: read ? pinTexts(read.value) : EMPTY_TEXTS });
  }
  return { ok: true, pins, recased: named.pins.filter(({ name, written }) => name !== written.trim()) };
}

export const sameTexts = (one: PinTexts, other: PinTexts): boolean =>
  PIN_COLUMNS.every((column) => one[column] === other[column]);
