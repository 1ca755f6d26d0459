import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { clearCells, fillAll, fillDown, typeInto } from "@/components/wiring/grid/fill";
import { at, type Selection } from "@/components/wiring/grid/selection";
import { placeOf } from "@/components/wiring/grid/table-text";
import { busNames } from "@/lib/calc/signal-names";
import { pinsOf, table } from "./table";

const SIGNAL = placeOf("signal");
const ROLE = placeOf("role");
const down = (column: number, top: number, bottom: number): Selection => ({
  anchor: { row: top, column },
  focus: { row: bottom, column },
});
const short = (planned: ReturnType<typeof fillDown>) =>
  planned.ok ? planned.changes.map(({ pin, column, after }) => `${pin} ${column} ${after}`) : planned.sentence;

describe("a bus range", () => {
  test.each([
    ["D[7:0]", ["D7", "D6", "D5", "D4", "D3", "D2", "D1", "D0"]],
    ["A[0:2]_N", ["A0_N", "A1_N", "A2_N"]],
    ["/CS[1:1]", ["/CS1"]],
  ])("%s names its signals in the order it names them", (text, names) => {
    expect(busNames(text)).toEqual(names);
  });

  test.each(["D[7]", "D", "", "[7:0]", "D[7:]", "D[a:b]", "D[0:99999]"])("%j is a plain text", (text) => {
    expect(busNames(text)).toBeUndefined();
  });

  test("has as many names as its ends are apart and one, all different", () => {
    const end = fc.integer({ min: 0, max: 400 });
    fc.assert(
      fc.property(end, end, (from, to) => {
        const names = busNames(`D[${from}:${to}]`) ?? [];
        expect(new Set(names).size).toBe(Math.abs(from - to) + 1);
        expect([names[0], names.at(-1)]).toEqual([`D${from}`, `D${to}`]);
      }),
    );
  });

  test("typed over as many pins fills them, whichever end the selection was begun at", () => {
    const upwards = typeInto(table(pinsOf("a", 4)), down(SIGNAL, 3, 2), "D[1:0]");
    expect(short(upwards)).toEqual(["a3 signal D1", "a4 signal D0"]);
  });

  test("typed over one pin says both numbers and changes nothing", () => {
    expect(short(typeInto(table(pinsOf("a", 4)), at(0, SIGNAL), "D[3:0]"))).toBe(
      "D[3:0] names 4 signals, but 1 pin is selected. Select 4 pins and type it again; nothing was changed.",
    );
  });

  test("in another column is a text like any other", () => {
    expect(short(typeInto(table(pinsOf("a", 4)), at(0, placeOf("note")), "D[3:0]"))).toEqual(["a1 note D[3:0]"]);
  });
});

describe("filling", () => {
  const kept = { a1: { signal: "GND", role: "ground" }, a2: { signal: "CLK" } };

  test("down takes the top row into the rows below", () => {
    const selection = { anchor: { row: 0, column: SIGNAL }, focus: { row: 2, column: ROLE } };
    expect(short(fillDown(table(pinsOf("a", 4), kept), selection))).toEqual([
      "a2 signal GND",
      "a2 role ground",
      "a3 signal GND",
      "a3 role ground",
    ]);
  });

  test("down in a single row takes the row above it", () => {
    expect(short(fillDown(table(pinsOf("a", 4), kept), at(1, ROLE)))).toEqual(["a2 role ground"]);
    expect(short(fillDown(table(pinsOf("a", 4), kept), at(0, ROLE)))).toBe("There is no row above to fill from.");
  });

  test("all puts one text into every cell of the selection", () => {
    expect(short(fillAll(table(pinsOf("a", 4), kept), down(SIGNAL, 0, 1), "GND"))).toEqual(["a2 signal GND"]);
  });

  test("never touches the names of the pins", () => {
    const selection = { anchor: { row: 0, column: 0 }, focus: { row: 1, column: 1 } };
    expect(short(clearCells(table(pinsOf("a", 4), kept), selection))).toEqual(["a1 signal ", "a2 signal "]);
  });
});
