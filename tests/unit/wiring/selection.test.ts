import { describe, expect, test } from "vitest";
import { commandFor, type Pressed } from "@/components/wiring/grid/key-commands";
import { areaOf, at, everything, moveBy, moveTo, nextCell } from "@/components/wiring/grid/selection";

const size = { rows: 64, columns: 8 };
const press = (pressed: Partial<Pressed> & { key: string }) =>
  commandFor({ isControl: false, isShift: false, isAlt: false, ...pressed }, { row: 10, column: 3 }, size, 20);

describe("the cell one is in", () => {
  test("stays in the table at its edges", () => {
    expect(moveBy(at(0, 0), { row: -1, column: -1 }, size).focus).toEqual({ row: 0, column: 0 });
    expect(moveTo(at(0, 0), { row: 999, column: 99 }, size).focus).toEqual({ row: 63, column: 7 });
    expect(moveTo(at(0, 0), { row: 3, column: 0 }, { rows: 0, columns: 8 }).focus).toEqual({ row: 0, column: 0 });
  });

  test("with shift leaves the other end where it is, and the selection grows and shrinks", () => {
    const grown = moveBy(moveBy(at(4, 1), { row: 3, column: 0 }, size, true), { row: -5, column: 2 }, size, true);
    expect(areaOf(grown)).toEqual({ top: 2, bottom: 4, left: 1, right: 3 });
    expect(areaOf(moveBy(grown, { row: 1, column: 0 }, size))).toEqual({ top: 3, bottom: 3, left: 3, right: 3 });
  });

  test.each([
    ["Home", false, { row: 10, column: 0 }],
    ["End", false, { row: 10, column: 7 }],
    ["Home", true, { row: 0, column: 0 }],
    ["End", true, { row: 63, column: 7 }],
    ["PageDown", false, { row: 29, column: 3 }],
    ["PageUp", false, { row: -9, column: 3 }],
    ["ArrowDown", true, { row: 63, column: 3 }],
    ["ArrowLeft", false, { row: 10, column: 2 }],
  ])("goes with %s (with control: %s) where a spreadsheet's goes", (key, isControl, to) => {
    expect(press({ key, isControl })).toEqual({ kind: "move", to, extend: false });
    expect(press({ key, isControl, isShift: true })).toEqual({ kind: "move", to, extend: true });
  });

  test("is all of the table after select all, and none of an empty one", () => {
    expect(areaOf(everything(size, { row: 5, column: 5 }))).toEqual({ top: 0, bottom: 63, left: 0, right: 7 });
    expect(everything({ rows: 0, columns: 8 }, { row: 0, column: 0 }).focus).toEqual({ row: 0, column: 0 });
  });
});

describe("a key", () => {
  test.each([
    ["Enter", {}, { kind: "edit" }],
    ["F2", {}, { kind: "edit" }],
    ["p", {}, { kind: "edit", text: "p" }],
    ["+", { isShift: true }, { kind: "edit", text: "+" }],
    ["Delete", {}, { kind: "clear" }],
    ["Escape", {}, { kind: "one-cell" }],
    ["d", { isControl: true }, { kind: "fill-down" }],
    ["a", { isControl: true }, { kind: "all" }],
    ["z", { isControl: true }, { kind: "undo" }],
    ["Z", { isControl: true, isShift: true }, { kind: "redo" }],
    ["y", { isControl: true }, { kind: "redo" }],
    ["Tab", { isShift: true }, { kind: "tab", step: -1 }],
  ])("%s %j does what it does in a spreadsheet", (key, held, command) => {
    expect(press({ key, ...held })).toEqual(command);
  });

  test.each([
    ["c", { isControl: true }],
    ["v", { isControl: true }],
    ["s", { isControl: true }],
    ["Shift", {}],
    ["F5", {}],
    ["toString", {}],
    ["é", { isAlt: true }],
  ])("%s %j is left to the browser", (key, held) => {
    expect(press({ key, ...held })).toBeUndefined();
  });
});

describe("the tabulator", () => {
  const typed = [1, 2, 3];
  test("walks the row and lets one out of the table at its end", () => {
    expect(nextCell({ row: 2, column: 1 }, 1, typed, 64, false)).toEqual({ row: 2, column: 2 });
    expect(nextCell({ row: 2, column: 3 }, 1, typed, 64, false)).toBeUndefined();
    expect(nextCell({ row: 2, column: 1 }, -1, typed, 64, false)).toBeUndefined();
  });

  test("goes on in the next row while one types, until the table ends", () => {
    expect(nextCell({ row: 2, column: 3 }, 1, typed, 64, true)).toEqual({ row: 3, column: 1 });
    expect(nextCell({ row: 2, column: 1 }, -1, typed, 64, true)).toEqual({ row: 1, column: 3 });
    expect(nextCell({ row: 63, column: 3 }, 1, typed, 64, true)).toBeUndefined();
  });
});
