import type { Place, Size } from "./selection";

type Pressed = { key: string; isJump: boolean };

/** Where a key leads from a place; undefined when it is no key of movement. `page` is how many rows are in sight. */
export function placeAfterKey({ key, isJump }: Pressed, { row, column }: Place, size: Size, page: number) {
  const last: Place = { row: size.rows - 1, column: size.columns - 1 };
  const step = Math.max(1, page - 1);
  const places: Record<string, Place> = {
    ArrowUp: { row: isJump ? 0 : row - 1, column },
    ArrowDown: { row: isJump ? last.row : row + 1, column },
    ArrowLeft: { row, column: isJump ? 0 : column - 1 },
    ArrowRight: { row, column: isJump ? last.column : column + 1 },
    Home: { row: isJump ? 0 : row, column: 0 },
    End: { row: isJump ? last.row : row, column: last.column },
    PageUp: { row: row - step, column },
    PageDown: { row: row + step, column },
  };
  return Object.hasOwn(places, key) ? places[key] : undefined;
}
