import fc from "fast-check";
import { expect, test } from "vitest";
import { readIpcD356 } from "@/lib/calc/netlist";

const PAD = "327A                U1    -1          A01X+000000Y+000000X0600Y0000R000 S0";
const read = (...lines: string[]) => readIpcD356(lines.join("\n"));
const nets = (text: string) => readIpcD356(text).netlist.nets;

test("line ends of all systems, blanks behind and a mark of the byte order make no difference", () => {
  const lines = ["P  UNITS CUST 0", PAD, "327B                U1    -2          A01X+001000Y+000000", "999"];
  const plain = nets(lines.join("\n"));
  expect(plain.map(({ name }) => name)).toEqual(["A", "B"]);
  for (const text of [lines.join("\r\n"), lines.join("\r"), lines.map((line) => `${line}      `).join("\n")]) {
    expect(nets(text)).toEqual(plain);
  }
  expect(nets(`\ufeff${lines.join("\n")}\n\u001a`)).toEqual(plain);
});

test("a line beyond 80 columns is taken and said", () => {
  const reading = read("P  UNITS CUST 0", PAD.padEnd(90, "x"), "999");
  expect(reading.netlist.nets).toHaveLength(1);
  expect(reading.warnings).toEqual([{ line: 2, reason: expect.stringContaining("more than 80 columns") }]);
});

test("what cannot be used is passed over by line, and the rest is read", () => {
  const reading = read(
    "P  UNITS CUST 0",
    "hello",
    "417A                U1    -1",
    "017A                U1    -1          A01X+000000Y+000000",
    "327A                U1    -9          A01X+0000x0Y+000000",
    "079B",
    PAD,
    "999",
    PAD,
  );
  expect(reading.passedOver.map(({ line }) => line)).toEqual([2, 3, 4, 5, 6, 9]);
  expect(reading.netlist.nets[0]?.points.map(({ pin }) => pin)).toEqual(["1"]);
});

test("without units and without an end the file is read, with both said", () => {
  const { warnings } = read(PAD);
  expect(warnings.map(({ line }) => line)).toEqual([0, 0]);
  expect(warnings.map(({ reason }) => reason).join(" ")).toMatch(/names no units.*no end record/);
});

test("a pin that two nets claim is said with both", () => {
  const { warnings } = read("P  UNITS CUST 0", PAD, PAD.replace("327A", "327B"), "999");
  expect(warnings).toEqual([{ line: 3, reason: "U1-1 belongs to A already and is named for B, too." }]);
});

test("names that fill all 14 columns may have been cut, and long names with one beginning may become one", () => {
  const cut = read("P  UNITS CUST 0", PAD.replace("A             ", "ADDRESS_STROBE"), "999");
  expect(cut.warnings[0]?.reason).toContain("ADDRESS_STROBE fills all 14 columns");
  const alike = read(
    "P  UNITS CUST 0",
    "P  NNAME1  ADDRESS_STROBE_EARLY",
    "P  NNAME2  ADDRESS_STROBE_LATE",
    PAD.replace("A     ", "NNAME1"),
    PAD.replace("A     ", "NNAME2").replace("-1", "-2"),
    "999",
  );
  expect(alike.warnings[0]?.reason).toContain("ADDRESS_STROBE_EARLY and ADDRESS_STROBE_LATE begin with the same");
});

test("an alias without its long name keeps the alias, and says so", () => {
  const { netlist, warnings } = read("P  UNITS CUST 0", PAD.replace("A     ", "NNAME7"), "999");
  expect(netlist.nets[0]?.name).toBe("NNAME7");
  expect(warnings[0]?.reason).toContain("NNAME7");
});

test("points of the panel around the board are no points of the board", () => {
  const reading = read("P  UNITS CUST 0", "P  IMAGE PRIMARY", PAD, "P  IMAGE PANEL", PAD.replace("-1", "-2"), "999");
  expect(reading.netlist.nets[0]?.points).toHaveLength(1);
  expect(reading.passedOver).toEqual([{ line: 5, reason: "Belongs to the panel, not to the board." }]);
});

test("ten thousand bad lines give a thousand notes at most, and the number of the others", () => {
  const { passedOver } = read(...Array.from({ length: 10_000 }, (_, at) => `${at % 7 === 0 ? "x" : `4${at}`}`));
  expect(passedOver.length).toBeLessThan(1100);
  expect(passedOver.some(({ line, reason }) => line === 0 && /more/.test(reason))).toBe(true);
});

const scraps = fc.oneof(
  fc.string(),
  fc.constantFrom(
    PAD,
    "P  UNITS CUST 2",
    "P  UNITS",
    "P",
    "C",
    "379",
    "079A B",
    "389BOARD_EDGE X1Y1 X",
    "089*",
    "999",
    "017",
  ),
  fc
    .tuple(fc.nat(PAD.length), fc.string({ maxLength: 8 }))
    .map(([at, text]) => PAD.slice(0, at) + text + PAD.slice(at)),
  fc
    .tuple(fc.constantFrom("317", "327", "307", "337", "027"), fc.string({ unit: "binary", maxLength: 90 }))
    .map(([code, text]) => code + text),
);

test("any text is read without a crash, and every point and note has a line of the text", () => {
  fc.assert(
    fc.property(fc.array(scraps, { maxLength: 12 }), fc.constantFrom("\n", "\r\n", "\r"), (lines, end) => {
      const text = lines.join(end);
      const count = text.split(/\r\n?|\n/).length;
      const { netlist, passedOver, warnings } = readIpcD356(text);
      const points = [...netlist.nets.flatMap((net) => net.points), ...netlist.unconnected];
      for (const { line } of points) expect(line >= 1 && line <= count).toBe(true);
      for (const { line, reason } of [...passedOver, ...warnings]) {
        expect(line >= 0 && line <= count).toBe(true);
        expect(reason).toMatch(/[.;]$/);
      }
      for (const { points: some } of netlist.nets) expect(some.length).toBeGreaterThan(0);
      for (const { xMm, yMm, holeMm } of points) {
        for (const value of [xMm, yMm, holeMm]) expect(Number.isNaN(value)).toBe(false);
      }
    }),
    { numRuns: 500 },
  );
});
