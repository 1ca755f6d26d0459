import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { CALCULATIONS, findCalculation } from "@/lib/calc-api/list";

const called = CALCULATIONS.map((calculation) => [calculation.name, calculation] as const);

/** Every number of a JSON value, with the path to it. */
function numbersIn(value: unknown, path: (string | number)[] = []): { path: (string | number)[]; value: number }[] {
  if (typeof value === "number") return [{ path, value }];
  if (typeof value !== "object" || value === null) return [];
  return Object.entries(value).flatMap(([key, inner]) => numbersIn(inner, [...path, key]));
}

function withNumber(value: unknown, path: (string | number)[], replacement: unknown): unknown {
  const [head, ...rest] = path;
  if (head === undefined) return replacement;
  if (Array.isArray(value)) {
    return value.map((inner: unknown, index) =>
      String(index) === String(head) ? withNumber(inner, rest, replacement) : inner,
    );
  }
  const fields = Object.entries(value ?? {});
  return Object.fromEntries(
    fields.map(([key, inner]) => [key, key === head ? withNumber(inner, rest, replacement) : inner]),
  );
}

const answered = (name: string, input: unknown) => findCalculation(name)?.calculate(input);
const fieldsOf = (answer: ReturnType<typeof answered>) => (answer && !answer.ok ? (answer.error.fields ?? {}) : {});

describe.each(called)("%s", (_name, calculation) => {
  test("shows an example that works, and says where its formulas come from", () => {
    const answer = calculation.calculate(calculation.example);
    expect(answer).toMatchObject({ ok: true, value: { calculation: calculation.name, source: expect.any(String) } });
    expect(JSON.stringify(answer)).toMatch(/sentence|rule|why/);
  });

  test("says what it takes as a schema that knows no other fields", () => {
    const card = JSON.parse(JSON.stringify(calculation.card()));
    expect(card.input).toMatchObject({ type: "object", additionalProperties: false });
    expect(card).toMatchObject({ leavesOut: expect.any(String), most: expect.any(String), note: expect.any(String) });
  });

  test("names a field that it does not know", () => {
    const answer = calculation.calculate({ ...Object(calculation.example), colour: "red" });
    expect(fieldsOf(answer)).toEqual({ colour: "There is no such field here." });
  });

  test("never throws, whatever it is sent", () => {
    fc.assert(fc.property(fc.anything(), (input) => typeof calculation.calculate(input).ok === "boolean"));
  });

  test("answers figures or a sentence, never infinity, when one figure of its example is absurd", () => {
    const leaves = numbersIn(calculation.example);
    const absurd = fc.constantFrom(
      0,
      -1,
      -0,
      1e-320,
      1e-30,
      1e30,
      1e308,
      Number.MAX_SAFE_INTEGER,
      0.1 + 0.2,
      "NaN",
      null,
    );
    fc.assert(
      fc.property(fc.constantFrom(...leaves), absurd, ({ path }, value) => {
        const answer = calculation.calculate(withNumber(calculation.example, path, value));
        if (!answer.ok) return Object.keys(answer.error.fields ?? {}).length > 0;
        return numbersIn(answer.value.result).every(({ value: figure }) => Number.isFinite(figure));
      }),
      { numRuns: 300 },
    );
  });
});

describe("what cannot be used is named with its path", () => {
  test("a figure in quotes, and words for what is no figure", () => {
    const limits = { lower: 4.75, upper: 5.25 };
    expect(fieldsOf(answered("conformity", { reading: "4.98", limits })).reading).toContain("without quotes");
    expect(fieldsOf(answered("conformity", { reading: "Infinity", limits })).reading).toContain("“Infinity” is text");
    expect(fieldsOf(answered("conformity", { limits }))).toEqual({ reading: "This is missing: give a number." });
  });

  test("limits the wrong way round", () => {
    const wrong = { reading: 5, limits: { lower: 6, upper: 4 } };
    expect(fieldsOf(answered("conformity", wrong))).toEqual({ limits: "The lower limit lies above the upper one." });
  });

  test("a family that nobody knows", () => {
    const input = { driver: "HC", receivers: [{ family: "LS" }, { family: "QX" }] };
    expect(fieldsOf(answered("levels", input))["receivers.1.family"]).toContain("There is no family QX");
  });

  test("a block inside itself, by the block's name", () => {
    const blocks = [{ name: "A", children: [{ block: "A", count: 1 }] }];
    const answer = answered("packing", { blocks, board: { use: [{ block: "A", count: 1 }] } });
    expect(Object.values(fieldsOf(answer)).join()).toContain("contains itself");
  });

  test("a negative count of gates", () => {
    const board = { loose: [{ gateFunction: "nand2", count: -4 }] };
    expect(fieldsOf(answered("packing", { board }))).toEqual({ "board.loose.0.count": "At least 1." });
  });

  test("a pin that the connector has not, and one that is there twice", () => {
    const pins = [{ pin: "a4" }, { pin: "d9" }, { pin: "A4" }].map((pin) => ({ ...pin, role: "input" }));
    const boards = [{ code: "CON", connectors: [{ reference: "J1", type: "din41612-b64", pins }] }];
    expect(fieldsOf(answered("interconnect", { boards }))).toEqual({
      "boards.0.connectors.0.pins.1.pin": expect.stringContaining("has no pin d9"),
      "boards.0.connectors.0.pins.2.pin": "Pin A4 is there twice.",
    });
  });

  test("a mating of what does not stand in the machine", () => {
    const boards = [{ code: "CON", connectors: [{ reference: "J1", type: "din41612-b64", pins: [] }] }];
    const matings = [{ from: { placement: "CON", connector: "J2" }, to: { placement: "BPL", connector: "X1" } }];
    expect(Object.keys(fieldsOf(answered("interconnect", { boards, matings })))).toEqual([
      "matings.0.from.connector",
      "matings.0.to.placement",
    ]);
  });

  test("more connectors than are checked at once, also when one board stands in many places", () => {
    const connectors = Array.from({ length: 3 }, (_, index) => ({
      reference: `J${index}`,
      type: "header-2x5",
      pins: [],
    }));
    const placements = Array.from({ length: 100 }, (_, index) => ({ id: `C${index}`, board: "CON", slot: index }));
    const answer = answered("interconnect", { boards: [{ code: "CON", connectors }], placements });
    expect(fieldsOf(answer).placements).toBe("Together they have 300 connectors; at most 200 are checked at once.");
  });

  test("at most fifty of ten thousand wrong rows", () => {
    const steps = Array.from({ length: 400 }, () => ({ name: 5 }));
    expect(Object.keys(fieldsOf(answered("delay", { steps })))).toHaveLength(50);
  });
});

describe("published values come out of the interface as they stand in their source", () => {
  const resultOf = (name: string, input: unknown) => {
    const answer = answered(name, input);
    if (!answer?.ok) throw new Error(JSON.stringify(answer));
    return answer.value.result;
  };

  test("a pull-up between 967 Ω and 1.77 kΩ: SLVA689, section 4", () => {
    const example = findCalculation("pull-up")?.example;
    expect(resultOf("pull-up", example)).toMatchObject({
      window: { minOhm: expect.closeTo(966.667, 2), riseMaxOhm: expect.closeTo(1770.33, 1) },
    });
  });

  test("an HC output drives ten LS inputs: TI SN74HC00", () => {
    const result = resultOf("levels", { driver: "HC", receivers: [{ family: "LS" }], supplyVolts: 4.75 });
    expect(result).toMatchObject({ pairs: [{ fanOut: { loads: 10 }, margins: { verdict: "fits" } }] });
  });

  test("eight ripple stages at 14, 9 and 9 ns: carry out after 158 ns (computed and simulated)", () => {
    const steps = [
      { name: "XOR", typicalS: 14e-9 },
      { name: "AND", count: 8, typicalS: 9e-9 },
      { name: "OR", count: 8, typicalS: 9e-9 },
    ];
    expect(resultOf("delay", { steps })).toMatchObject({ path: { typicalS: expect.closeTo(158e-9, 12) } });
  });

  test("four full adders in five quad packages", () => {
    expect(resultOf("packing", findCalculation("packing")?.example)).toMatchObject({ packageCount: 5 });
  });
});
