import type { Place, Size } from "./selection";

/** A key press with what was held; Control and the Mac's Command are the same here. */
export type Pressed = { key: string; isControl: boolean; isShift: boolean; isAlt: boolean };

export type Command =
  | { kind: "move"; to: Place; extend: boolean }
  | { kind: "tab"; step: 1 | -1 }
  /** Without a text one goes on with what stands there; with one it takes its place. */
  | { kind: "edit"; text?: string }
  | { kind: "clear" | "fill-down" | "undo" | "redo" | "all" | "one-cell" };

export const pressedOf = (
  event: Pick<KeyboardEvent, "key" | "ctrlKey" | "metaKey" | "shiftKey" | "altKey">,
): Pressed => ({
  key: event.key,
  isControl: event.ctrlKey || event.metaKey,
  isShift: event.shiftKey,
  isAlt: event.altKey,
});

/** What a key does while one moves in the table; undefined when it is not the table's. `page`: rows in sight. */
export function commandFor(pressed: Pressed, at: Place, size: Size, page: number): Command | undefined {
  const { key, isControl, isShift, isAlt } = pressed;
  if (isAlt) return undefined;
  const to = placeAfterKey(key, isControl, at, size, page);
  if (to) return { kind: "move", to, extend: isShift };
  if (key === "Tab" && !isControl) return { kind: "tab", step: isShift ? -1 : 1 };
  if (isControl) return withControl(key.toLowerCase(), isShift);
  if (key === "Enter" || key === "F2") return { kind: "edit" };
  if (key === "Delete" || key === "Backspace") return { kind: "clear" };
  if (key === "Escape") return { kind: "one-cell" };
  // One character, also one that is two code units long; names of keys are longer.
  return [...key].length === 1 ? { kind: "edit", text: key === " " ? "" : key } : undefined;
}

function withControl(key: string, isShift: boolean): Command | undefined {
  if (key === "z") return { kind: isShift ? "redo" : "undo" };
  if (key === "y" && !isShift) return { kind: "redo" };
  if (key === "d" && !isShift) return { kind: "fill-down" };
  if (key === "a" && !isShift) return { kind: "all" };
  return undefined;
}

function placeAfterKey(key: string, isJump: boolean, { row, column }: Place, size: Size, page: number) {
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
