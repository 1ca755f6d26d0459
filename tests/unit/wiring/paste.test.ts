import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { copyCells } from "@/components/wiring/grid/fill";
import { pasteBlock } from "@/components/wiring/grid/paste";
import { at, type Selection } from "@/components/wiring/grid/selection";
import { placeOf } from "@/components/wiring/grid/table-text";
import { parseTsv, writeTsv } from "@/components/wiring/grid/tsv";
import { pinsOf, table } from "./table";

const SIGNAL = placeOf("signal");
const from = (row: number, column: number, toRow = row, toColumn = column): Selection => ({
  anchor: { row, column },
  focus: { row: toRow, column: toColumn },
});
const short = (planned: ReturnType<typeof pasteBlock>) =>
  planned.ok ? planned.changes.map(({ pin, column, after }) => `${pin} ${column} ${after}`) : planned.sentence;

describe("a block from the clipboard", () => {
  test.each([
    [
      "with line feeds and a trailing line",
      "A\tB\nC\tD\n",
      [
        ["A", "B"],
        ["C", "D"],
      ],
    ],
    [
      "with carriage returns",
      "A\tB\r\nC\tD\r\n",
      [
        ["A", "B"],
        ["C", "D"],
      ],
    ],
    ["with quotes round a tab and a line end", '"A\tx"\t"B\ny"\n', [["A x", "B y"]]],
    ["with doubled quotes", '"say ""hi"""\tB', [['say "hi"', "B"]]],
    ["with a quote that is a plain character", '5" lead\tB', [['5" lead', "B"]]],
    [
      "with a quote that is never closed",
      '"open\tB\nC\tD',
      [
        ['"open', "B"],
        ["C", "D"],
      ],
    ],
    [
      "with short rows",
      "A\tB\tC\nD",
      [
        ["A", "B", "C"],
        ["D", "", ""],
      ],
    ],
    ["with our own escape before a sign", "'+5V\t'-12V", [["+5V", "-12V"]]],
    ["of one empty cell", "\r\n", [[""]]],
  ])("%s is read cell by cell", (_name, text, rows) => {
    expect(parseTsv(text)).toEqual(rows);
  });

  test("of any cells comes back as it was", () => {
    const cell = fc.string().map((text) => text.replace(/[\s\u0000-\u001f]+/g, " ").trim());
    fc.assert(
      fc.property(
        fc.integer({ min: 1, max: 6 }),
        fc.integer({ min: 2, max: 5 }),
        fc.infiniteStream(cell),
        (rows, columns, cells) => {
          const block = Array.from({ length: rows }, () =>
            Array.from({ length: columns }, () => cells.next().value ?? ""),
          );
          expect(parseTsv(writeTsv(block))).toEqual(block);
        },
      ),
    );
  });

  test("goes in from the corner of the selection", () => {
    const planned = pasteBlock(table(pinsOf("a", 4)), at(1, SIGNAL), [
      ["CLK", "pp"],
      ["CARRY_N", "in"],
    ]);
    expect(short(planned)).toEqual(["a2 signal CLK", "a2 role pp", "a3 signal CARRY_N", "a3 role in"]);
  });

  test("larger than the rest says how many rows did not fit, and the rest is put in", () => {
    const block = Array.from({ length: 60 }, (_, index) => [`S${index}`, "in"]);
    const planned = pasteBlock(table(pinsOf("a", 52)), at(0, SIGNAL), block);
    expect(planned).toMatchObject({
      ok: true,
      said: "52 rows put in. 8 rows of 60 did not fit below a52 and were left out.",
    });
  });

  test("wider than the rest says how many columns had no place", () => {
    const planned = pasteBlock(table(["a1"]), at(0, placeOf("note")), [["keep free", "x", "y"]]);
    expect(planned).toMatchObject({ ok: true, said: expect.stringContaining("2 columns had no place") });
    expect(short(planned)).toEqual(["a1 note keep free"]);
  });

  test("of one cell fills the whole selection", () => {
    const planned = pasteBlock(table(pinsOf("a", 3)), from(0, placeOf("family"), 2), [["HC"]]);
    expect(short(planned)).toEqual(["a1 family HC", "a2 family HC", "a3 family HC"]);
  });

  test("is repeated over a selection that is a multiple of it", () => {
    const planned = pasteBlock(table(pinsOf("a", 4)), from(0, SIGNAL, 3), [["GND"], ["+5V"]]);
    expect(short(planned)).toEqual(["a1 signal GND", "a2 signal +5V", "a3 signal GND", "a4 signal +5V"]);
  });

  test("of a bus range over eight pins fills them in its order", () => {
    const planned = pasteBlock(table(pinsOf("a", 8)), from(0, SIGNAL, 7), [["D[7:0]"]]);
    expect(short(planned)).toEqual([7, 6, 5, 4, 3, 2, 1, 0].map((bit, index) => `a${index + 1} signal D${bit}`));
  });

  test("of a bus range of another length changes nothing and names both numbers", () => {
    const sentence = short(pasteBlock(table(pinsOf("a", 8)), from(0, SIGNAL, 4), [["D[7:0]"]]));
    expect(sentence).toBe(
      "D[7:0] names 8 signals, but 5 pins are selected. Select 8 pins and type it again; nothing was changed.",
    );
  });
});

describe("a block that begins with names of pins", () => {
  test("puts each row at its pin, in whatever order and case", () => {
    const planned = pasteBlock(table(pinsOf("a", 4)), at(0, 0), [
      ["A3", "CLK"],
      ["a1", "GND"],
    ]);
    expect(short(planned)).toEqual(["a3 signal CLK", "a1 signal GND"]);
  });

  test("names the rows with a pin that is not there or was there before, and takes the others", () => {
    const block = [
      ["a1", "GND"],
      ["b40", "X"],
      ["a2", "CLK"],
      ["a1", "CLK2"],
      ["", "Y"],
    ];
    const planned = pasteBlock(table(pinsOf("a", 4)), at(0, 0), block);
    expect(short(planned)).toEqual(["a1 signal GND", "a2 signal CLK"]);
    expect(planned).toMatchObject({
      said: "2 rows put in, each at the pin it names. 3 rows left out: row 2 names “b40”, which is no pin here; row 4 names a1 like row 1; row 5 names no pin.",
    });
  });

  test("with headings goes where they say, wherever one pastes", () => {
    const block = [
      ["Pull-up", "Pin", "Colour", "Signal"],
      ["4k7", "a2", "red", "FAULT_N"],
    ];
    const planned = pasteBlock(table(pinsOf("a", 4)), at(3, 3), block);
    expect(short(planned)).toEqual(["a2 pullUpOhm 4k7", "a2 signal FAULT_N"]);
    expect(planned).toMatchObject({ said: expect.stringContaining("1 column had no place") });
  });

  test("changes nothing when no row names a pin", () => {
    expect(
      short(
        pasteBlock(table(["a1"]), at(0, 0), [
          ["x9", "CLK"],
          ["x8", "CLK"],
        ]),
      ),
    ).toContain("Nothing was changed.");
  });

  test("of whole rows that were copied here comes back identical", () => {
    const pins = pinsOf("a", 3);
    const kept = { a1: { signal: "+5V", role: "power" }, a3: { signal: "-12V", note: '=1+1 "x"' } };
    const copied = writeTsv(copyCells(table(pins, kept), from(0, 0, 2, 7)));
    expect(copied).not.toMatch(/(^|\t)[=+-]/m);
    const planned = pasteBlock(table(pins), at(0, 0), parseTsv(copied));
    expect(short(planned)).toEqual(["a1 signal +5V", "a1 role power", "a3 signal -12V", 'a3 note =1+1 "x"']);
  });
});

describe("ten thousand rows", () => {
  test("are read and put in without a pause", () => {
    const text = Array.from({ length: 10_000 }, (_, index) => `S${index}\tpush-pull output\tHC\t1\t\t\t`).join("\r\n");
    const began = performance.now();
    const planned = pasteBlock(table(pinsOf("a", 96)), at(0, SIGNAL), parseTsv(text));
    expect(performance.now() - began).toBeLessThan(1000);
    expect(planned).toMatchObject({ said: expect.stringContaining("9904 rows of 10000 did not fit below a96") });
  });
});
