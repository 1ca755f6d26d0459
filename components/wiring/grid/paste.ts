import { COLUMN_NAMES, PIN_COLUMNS } from "@/lib/pin-map/pin-columns";
import { fillAll, spreadBus, type Planned } from "./fill";
import { areaOf, isOneCell, type Area, type Selection } from "./selection";
import { changeOf, PIN_PLACE, placeOf, TABLE_COLUMNS, type CellChange, type TableText } from "./table-text";

const MOST_NAMED = 3;
const counted = (count: number, one: string) => `${count} ${one}${count === 1 ? "" : "s"}`;

/** Where a column of the block goes; undefined where it has no place. */
type Columns = readonly (number | undefined)[];

/**
 * Puts a block of cells from a spreadsheet into the table. One cell fills the selection; a block begins at the
 * selection's corner and is repeated where the selection is a multiple of it. Begun in the column of pins, each row
 * goes to the pin that it names, in whatever order. What does not fit is said and left out.
 */
export function pasteBlock(table: TableText, selection: Selection, block: readonly (readonly string[])[]): Planned {
  const [first] = block;
  if (!first || first.length === 0) return { ok: false, sentence: "There is nothing on the clipboard to paste." };
  if (block.length === 1 && first.length === 1) {
    const text = first[0] ?? "";
    if (selection.focus.column === PIN_PLACE && isOneCell(areaOf(selection))) {
      return { ok: false, sentence: "The names of pins come from the connector. Paste beside them." };
    }
    return spreadBus(table, selection, text) ?? fillAll(table, selection, text);
  }
  const { left, ...area } = areaOf(selection);
  const headings = columnsByHeading(first);
  if (headings && headings.includes(PIN_PLACE)) return pasteByPin(table, block.slice(1), headings, 2);
  const columns = headings ?? first.map((_, index) => (left + index < TABLE_COLUMNS ? left + index : undefined));
  if (columns.includes(PIN_PLACE)) return pasteByPin(table, block, columns, 1);
  const body = headings ? block.slice(1) : block;
  return pasteInPlace(table, { left, ...area }, body, columns);
}

/** A first row that names columns of ours says where each column goes; other columns are left out. */
function columnsByHeading(row: readonly string[]): Columns | undefined {
  const places = row.map((cell) => {
    const name = cell.trim().toLowerCase();
    if (name === "pin") return PIN_PLACE;
    const column = PIN_COLUMNS.find((one) => COLUMN_NAMES[one].toLowerCase() === name);
    return column && placeOf(column);
  });
  const known = places.filter((place) => place !== undefined);
  return known.length >= 2 && new Set(known).size === known.length ? places : undefined;
}

function pasteInPlace(table: TableText, area: Area, body: readonly (readonly string[])[], columns: Columns): Planned {
  const chosen = { rows: area.bottom - area.top + 1, columns: area.right - area.left + 1 };
  const isMultiple = chosen.rows % body.length === 0 && chosen.columns % columns.length === 0;
  const down = isMultiple ? chosen.rows / body.length : 1;
  const across = isMultiple ? chosen.columns / columns.length : 1;
  const room = Math.max(0, table.rows.length - area.top);
  const fitting = Math.min(body.length * down, room);
  const changes: CellChange[] = [];
  for (let index = 0; index < fitting; index += 1) {
    const cells = body[index % body.length] ?? [];
    for (let repeat = 0; repeat < across; repeat += 1) {
      columns.forEach((place, column) => {
        if (place === undefined) return;
        changes.push(...changeOf(table, area.top + index, place + repeat * columns.length, cells[column] ?? ""));
      });
    }
  }
  const said = [`${counted(fitting, "row")} put in.`];
  const over = body.length * down - fitting;
  if (over > 0) {
    const last = table.labelAt(table.rows.length - 1);
    said.push(
      `${counted(over, "row")} of ${body.length * down} did not fit below ${last} and ${over === 1 ? "was" : "were"} left out.`,
    );
  }
  return { ok: true, changes, said: [...said, ...strayColumns(columns)].join(" ") };
}

function pasteByPin(
  table: TableText,
  body: readonly (readonly string[])[],
  columns: Columns,
  firstRow: number,
): Planned {
  const pinColumn = columns.indexOf(PIN_PLACE);
  const seen = new Map<number, number>();
  const left: string[] = [];
  const changes: CellChange[] = [];
  body.forEach((cells, index) => {
    const line = index + firstRow;
    const name = cells[pinColumn] ?? "";
    if (name.trim() === "" && cells.every((cell) => cell.trim() === "")) return;
    const row = table.rowNamed(name);
    const earlier = row === undefined ? undefined : seen.get(row);
    if (row === undefined)
      left.push(`row ${line} names ${name.trim() === "" ? "no pin" : `“${name}”, which is no pin here`}`);
    else if (earlier !== undefined) left.push(`row ${line} names ${table.labelAt(row)} like row ${earlier}`);
    else {
      seen.set(row, line);
      columns.forEach((place, column) => {
        if (place !== undefined && place !== PIN_PLACE)
          changes.push(...changeOf(table, row, place, cells[column] ?? ""));
      });
    }
  });
  const said = [`${counted(seen.size, "row")} put in, each at the pin it names.`];
  if (left.length > 0) {
    const named = left.slice(0, MOST_NAMED).join("; ");
    const more = left.length > MOST_NAMED ? `; and ${left.length - MOST_NAMED} more` : "";
    said.push(`${counted(left.length, "row")} left out: ${named}${more}.`);
  }
  if (seen.size === 0) return { ok: false, sentence: [...said.slice(1), "Nothing was changed."].join(" ") };
  return { ok: true, changes, said: [...said, ...strayColumns(columns)].join(" ") };
}

function strayColumns(columns: Columns): string[] {
  const stray = columns.filter((place) => place === undefined).length;
  return stray === 0
    ? []
    : [`${counted(stray, "column")} had no place in the table and ${stray === 1 ? "was" : "were"} left out.`];
}
