/** A place in the table, both counted from 0. */
export type Place = { row: number; column: number };

/** From the cell where it was begun to the cell one is in; both the same while one cell is chosen. */
export type Selection = { anchor: Place; focus: Place };

export type Size = { rows: number; columns: number };

export type Area = { top: number; bottom: number; left: number; right: number };

export const at = (row: number, column: number): Selection => ({ anchor: { row, column }, focus: { row, column } });

export function areaOf({ anchor, focus }: Selection): Area {
  return {
    top: Math.min(anchor.row, focus.row),
    bottom: Math.max(anchor.row, focus.row),
    left: Math.min(anchor.column, focus.column),
    right: Math.max(anchor.column, focus.column),
  };
}

export const isInArea = ({ top, bottom, left, right }: Area, row: number, column: number): boolean =>
  row >= top && row <= bottom && column >= left && column <= right;

export const isOneCell = ({ top, bottom, left, right }: Area): boolean => top === bottom && left === right;

const between = (value: number, most: number) => Math.min(Math.max(value, 0), Math.max(most, 0));

export function clampPlace({ row, column }: Place, { rows, columns }: Size): Place {
  return { row: between(row, rows - 1), column: between(column, columns - 1) };
}

/** Moves the cell one is in; with `extend` the other end stays, so that the selection grows or shrinks. */
export function moveBy(selection: Selection, by: Place, size: Size, extend = false): Selection {
  const { row, column } = selection.focus;
  return moveTo(selection, { row: row + by.row, column: column + by.column }, size, extend);
}

export function moveTo(selection: Selection, place: Place, size: Size, extend = false): Selection {
  const focus = clampPlace(place, size);
  return { anchor: extend ? selection.anchor : focus, focus };
}

export const everything = ({ rows, columns }: Size, focus: Place): Selection =>
  // One stays where one is looking: the selection's ends are the corners, the view does not jump.
  rows === 0
    ? { anchor: focus, focus }
    : { anchor: { row: 0, column: 0 }, focus: { row: rows - 1, column: columns - 1 } };

/**
 * The next cell in reading order, within `columns` only (the ones that can be typed into); undefined past either end of
 * a row when `wraps` is false, and past the ends of the table in any case.
 */
export function nextCell(place: Place, step: 1 | -1, columns: readonly number[], rows: number, wraps: boolean) {
  const candidates = step > 0 ? columns : [...columns].reverse();
  const inRow = candidates.find((column) => (column - place.column) * step > 0);
  if (inRow !== undefined) return { row: place.row, column: inRow };
  const row = place.row + step;
  const first = candidates[0];
  return wraps && first !== undefined && row >= 0 && row < rows ? { row, column: first } : undefined;
}
