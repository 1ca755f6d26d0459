import fc from "fast-check";
import { expect, test } from "vitest";
import {
  PIN_LIST_COLUMNS,
  PIN_LIST_HEADER,
  readIpcD356,
  readPinList,
  writePinList,
  type Netlist,
} from "@/lib/calc/netlist";

const numbered = (rows: readonly (readonly string[])[]) => rows.map((cells, at) => ({ line: at + 1, cells }));
const read = (...rows: string[][]) => readPinList(numbered(rows), PIN_LIST_COLUMNS);

test("rows of net, part and pin become nets; blank and N/C are no net", () => {
  const { netlist, passedOver } = read(
    ["GND", "U1", "7"],
    ["CLK", "U1", "3", "2.54", "5,08"],
    ["N/C", "U1", "4"],
    ["GND", "U2", "7"],
  );
  expect(netlist.nets.map(({ name, points }) => [name, points.map(({ part, pin }) => `${part}-${pin}`)])).toEqual([
    ["GND", ["U1-7", "U2-7"]],
    ["CLK", ["U1-3"]],
  ]);
  expect(netlist.nets[1]?.points[0]).toMatchObject({ xMm: 2.54, yMm: 5.08, line: 2 });
  expect(netlist.unconnected).toHaveLength(1);
  expect(passedOver).toEqual([]);
});

test("a written list has the columns that its header names", () => {
  const { netlist } = read(["CLK", "U1", "3", "2.54", "-5.08"]);
  const [row = []] = writePinList(netlist);
  expect(PIN_LIST_HEADER.map((name, at) => [name, row[at]])).toEqual([
    ["net", "CLK"],
    ["part", "U1"],
    ["pin", "3"],
    ["x (mm)", "2.54"],
    ["y (mm)", "-5.08"],
  ]);
});

test("bad rows are passed over by line: no pin, no part, a pin that is there already", () => {
  const { passedOver, warnings, netlist } = read(
    ["A", "U1", ""],
    ["A", "", "1"],
    ["A", "U1", "1"],
    ["A", "U1", "1"],
    ["B", "U1", "1"],
    ["", "", ""],
    ["A", "U1", "2", "left", "3"],
    ["A", "U1", "3", "3", ""],
  );
  expect(passedOver).toEqual([
    { line: 1, reason: "The row names no pin." },
    { line: 2, reason: "The row names no part." },
    { line: 4, reason: "U1-1 stands in line 3 already." },
    { line: 5, reason: "U1-1 belongs to A already (line 3)." },
  ]);
  expect(warnings.map(({ line }) => line)).toEqual([7, 8]);
  expect(netlist.nets[0]?.points.map(({ pin, xMm }) => [pin, xMm])).toEqual([
    ["1", null],
    ["2", null],
    ["3", null],
  ]);
});

test("part and pin may stand in one column, places may be in mil or inch", () => {
  const columns = { net: 1, part: null, pin: 0, x: 2, y: 3 };
  const rows = numbered([
    ["U1-3", "A", "100", "50"],
    ["J1 a4", "A"],
    ["U1", "A"],
  ]);
  const { netlist, passedOver } = readPinList(rows, columns, { unit: "mil" });
  expect(netlist.nets[0]?.points.map(({ part, pin, xMm, yMm }) => [part, pin, xMm, yMm])).toEqual([
    ["U1", "3", 2.54, 1.27],
    ["J1", "a4", null, null],
  ]);
  expect(passedOver).toEqual([{ line: 3, reason: "“U1” is not a part and a pin, such as U1-3." }]);
});

const word = fc.oneof(
  fc.constantFrom("GND", "+5V", "A B", "N/C", "", "U1", "J1", "1", "a4", "=1+1", "é"),
  fc.string({ maxLength: 6 }),
);
const figure = fc.oneof(
  fc.constant(""),
  fc.integer({ min: -999_999, max: 999_999 }).map((value) => String(value / 1000)),
  word,
);

const withoutLines = ({ nets, unconnected, ...rest }: Netlist) => ({
  ...rest,
  nets: nets.map(({ name, points }) => ({ name, points: points.map((point) => ({ ...point, line: 0 })) })),
  unconnected: unconnected.map((point) => ({ ...point, line: 0 })),
});

test("a pin list that is written and read again is the same netlist", () => {
  fc.assert(
    fc.property(fc.array(fc.tuple(word, word, word, figure, figure), { maxLength: 30 }), (rows) => {
      const { netlist } = readPinList(numbered(rows), PIN_LIST_COLUMNS);
      const again = readPinList(numbered(writePinList(netlist)), PIN_LIST_COLUMNS);
      expect(again.passedOver).toEqual([]);
      expect(withoutLines(again.netlist)).toEqual(withoutLines(netlist));
    }),
    { numRuns: 300 },
  );
});

test("a netlist of a layout keeps nets, pins and places in a pin list; vias have no name and stay behind", () => {
  const { netlist } = readIpcD356(
    [
      "P  UNITS CUST 0",
      "317in               U1    -1    D0600PA00X+017501Y+032003X0900Y0900R000 S3",
      "317in               VIA         D0240PA00X+017500Y-032000X0900Y0900R000 S3",
      "999",
    ].join("\n"),
  );
  const again = readPinList(numbered(writePinList(netlist)), PIN_LIST_COLUMNS).netlist;
  const [point] = netlist.nets[0]?.points ?? [];
  expect(again.nets).toEqual([
    { name: "in", points: [expect.objectContaining({ part: "U1", pin: "1", xMm: point?.xMm, yMm: point?.yMm })] },
  ]);
});
