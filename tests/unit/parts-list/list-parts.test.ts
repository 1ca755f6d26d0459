import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { listParts, type PartsListInput } from "@/lib/calc/parts-list";

const NO_SPARES = { percent: 0, minimum: 0 };
const line = (part: string, count: number, description = "") => ({ part, count, description });

function listed(input: PartsListInput) {
  const result = listParts(input);
  if (!result.ok) throw new Error(result.problems.map((problem) => problem.message).join(" "));
  return result.list;
}

const twoBoards: PartsListInput = {
  boards: [
    { code: "ADD", units: 4, lines: [line("74HC86", 2, "Quad XOR"), line("100 nF", 5), line("74HC86", 1)] },
    { code: "REG", units: 2, lines: [line("100 nF", 8, "X7R 0805"), line("74HC574", 8)] },
  ],
  spares: { percent: 10, minimum: 1 },
  known: {
    "74HC86": { stock: 20, price: { minor: 45, pieces: 1 } },
    "100 nF": { stock: 0, price: { minor: 340, pieces: 100 }, minimumSpares: 20 },
  },
};

describe("a parts list over all boards and units", () => {
  test("adds up what the units of each board need", () => {
    const [xor] = listed(twoBoards).lines;
    expect(xor).toMatchObject({ part: "74HC86", description: "Quad XOR", needed: 12, spares: 2, stock: 20, toBuy: 0 });
    expect(xor?.costMinor).toBe(0);
  });

  test("shows where each part goes", () => {
    const capacitor = listed(twoBoards).lines[1];
    expect(capacitor?.description).toBe("X7R 0805");
    expect(capacitor?.perBoard).toEqual([
      { code: "ADD", perUnit: 5, units: 4, total: 20 },
      { code: "REG", perUnit: 8, units: 2, total: 16 },
    ]);
  });

  test("takes the larger of the share and the minimum, and rounds money up to the cent", () => {
    const capacitor = listed(twoBoards).lines[1];
    expect(capacitor).toMatchObject({ needed: 36, spares: 20, toBuy: 56, costMinor: 191 });
  });

  test("says which parts have no price, so that nobody takes the sum for the whole", () => {
    expect(listed(twoBoards).totals).toEqual({
      parts: 3,
      needed: 64,
      toBuy: 74,
      costMinor: 191,
      withoutPrice: ["74HC574"],
    });
  });

  test.each([
    [100, 7, 7],
    [40, 2.5, 1],
    [41, 2.5, 2],
    [1000, 1.1, 11],
    [1, 10, 1],
    [0, 10, 0],
  ])("%i needed with %s %% spares are %i spare", (needed, percent, spares) => {
    const boards = [{ code: "A", units: needed, lines: [line("R", 1)] }];
    expect(listed({ boards, spares: { percent, minimum: 0 }, known: {} }).lines[0]?.spares).toBe(spares);
  });

  test("a board of which no unit is built needs nothing, not even a spare", () => {
    const boards = [{ code: "A", units: 0, lines: [line("R", 3)] }];
    const { lines } = listed({ boards, spares: { percent: 10, minimum: 5 }, known: {} });
    expect(lines[0]).toMatchObject({ needed: 0, spares: 0, toBuy: 0 });
  });

  test("a part called like something that every object has is a part", () => {
    const boards = [{ code: "A", units: 1, lines: [line("constructor", 3)] }];
    expect(listed({ boards, spares: NO_SPARES, known: {} }).lines[0]).toMatchObject({ stock: 0, toBuy: 3 });
  });
});

describe("what cannot be added up names its row", () => {
  const problems = (change: Partial<PartsListInput>) => {
    const result = listParts({ boards: [], spares: NO_SPARES, known: {}, ...change });
    return result.ok ? [] : result.problems.map((problem) => problem.row);
  };
  test.each([0, -2, 1.5, NaN, 1e9])("a count of %s", (count) => {
    expect(problems({ boards: [{ code: "A", units: 1, lines: [line("R", 1), line("C", count)] }] })).toEqual([
      "boards/0/lines/1",
    ]);
  });
  test("a part without a number", () => {
    expect(problems({ boards: [{ code: "A", units: 1, lines: [line(" ", 1)] }] })).toEqual(["boards/0/lines/0"]);
  });
  test("fewer than no units, stock, spares or money", () => {
    expect(problems({ boards: [{ code: "A", units: -1, lines: [] }] })).toEqual(["boards/0"]);
    expect(problems({ known: { R: { stock: -1, price: null } } })).toEqual(["known/R"]);
    expect(problems({ spares: { percent: -1, minimum: 0 } })).toEqual(["spares"]);
    expect(problems({ known: { R: { stock: 0, price: { minor: 1.5, pieces: 1 } } } })).toEqual(["known/R"]);
    expect(problems({ known: { R: { stock: 0, price: { minor: 1, pieces: 0 } } } })).toEqual(["known/R"]);
  });
});

test("whatever is on the list, stock and purchase cover need and spares, and nothing more is bought", () => {
  const boards = fc.array(
    fc.record({
      code: fc.constantFrom("A", "B"),
      units: fc.nat(20),
      lines: fc.array(
        fc.record({
          part: fc.constantFrom("R", "C", "U"),
          count: fc.integer({ min: 1, max: 500 }),
          description: fc.string(),
        }),
        { maxLength: 6 },
      ),
    }),
    { maxLength: 4 },
  );
  const price = fc.option(fc.record({ minor: fc.nat(1e6), pieces: fc.integer({ min: 1, max: 1000 }) }));
  const known = fc.dictionary(fc.constantFrom("R", "C", "U"), fc.record({ stock: fc.nat(5000), price }));
  const spares = fc.record({ percent: fc.integer({ min: 0, max: 5000 }).map((n) => n / 100), minimum: fc.nat(30) });
  fc.assert(
    fc.property(fc.record({ boards, known, spares }), (input) => {
      for (const one of listed(input).lines) {
        expect(one.stock + one.toBuy).toBeGreaterThanOrEqual(one.needed + one.spares);
        expect(one.toBuy === 0 || one.stock + one.toBuy === one.needed + one.spares).toBe(true);
        expect(one.spares).toBeGreaterThanOrEqual(one.needed > 0 ? input.spares.minimum : 0);
        expect(one.needed).toBe(one.perBoard.reduce((sum, board) => sum + board.total, 0));
        if (one.price && one.costMinor !== null)
          expect(one.costMinor * one.price.pieces).toBeGreaterThanOrEqual(one.toBuy * one.price.minor);
      }
    }),
  );
});
