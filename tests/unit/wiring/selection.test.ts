import { describe, expect, test } from "vitest";
import { placeAfterKey } from "@/components/wiring/grid/key-moves";
import { areaOf, at, everything, moveBy, moveTo, nextCell } from "@/components/wiring/grid/selection";

const size = { rows: 64, columns: 8 };

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
  ])("goes with %s (with control: %s) where a spreadsheet's goes", (key, isJump, place) => {
    expect(placeAfterKey({ key, isJump }, { row: 10, column: 3 }, size, 20)).toEqual(place);
  });

  test("is not moved by a letter, nor by a name that objects have anyway", () => {
    expect(placeAfterKey({ key: "x", isJump: false }, { row: 1, column: 1 }, size, 20)).toBeUndefined();
    expect(placeAfterKey({ key: "toString", isJump: false }, { row: 1, column: 1 }, size, 20)).toBeUndefined();
  });

  test("is all of the table after select all, and none of an empty one", () => {
    expect(areaOf(everything(size, { row: 5, column: 5 }))).toEqual({ top: 0, bottom: 63, left: 0, right: 7 });
    expect(everything({ rows: 0, columns: 8 }, { row: 0, column: 0 }).focus).toEqual({ row: 0, column: 0 });
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
