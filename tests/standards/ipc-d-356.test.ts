import { expect, test } from "vitest";
import { readIpcD356, type NetPoint } from "@/lib/calc/netlist";

/*
 * IPC-D-356 and IPC-D-356A. The standard was not opened. Columns, operation codes and units were read in the sources of four
 * open readers and writers and in a test-equipment maker's account of the format; records marked "real" are lines of
 * real exports; values in mm are computed from the columns.
 */

const file = (...lines: string[]) => lines.join("\n");
const inches = (...records: string[]) => readIpcD356(file("P  UNITS CUST 0", ...records, "999"));

function onlyPoint(reading: ReturnType<typeof readIpcD356>): NetPoint {
  const points = [...reading.netlist.nets.flatMap((net) => net.points), ...reading.netlist.unconnected];
  const [point] = points;
  if (!point || points.length > 1) throw new Error(`There are ${points.length} points.`);
  return point;
}

test("a through hole: net 4-17, part 21-26, pin 28-31, hole 34-37, place 42-57, pad 58-67, mask 73-74 (computed)", () => {
  const reading = inches("317in               U1    -1    D0600PA00X+017500Y+032000X0900Y0900R000 S3");
  expect(reading.netlist.nets.map(({ name }) => name)).toEqual(["in"]);
  expect(onlyPoint(reading)).toEqual({
    part: "U1",
    pin: "1",
    kind: "through",
    isMidPoint: false,
    side: "both",
    xMm: 44.45,
    yMm: 81.28,
    holeMm: 1.524,
    isPlated: true,
    padWidthMm: 2.286,
    padHeightMm: 2.286,
    turnDeg: 0,
    mask: "both",
    line: 2,
  });
  expect(reading.warnings).toEqual([]);
  expect(reading.passedOver).toEqual([]);
});

test("a via with blank-filled figures and a hole in mils: the place is right, the hole is flagged, not trusted (real)", () => {
  const reading = inches("317GND              VIA         D  24PA00X  14900Y   1450X 396Y 396");
  const via = onlyPoint(reading);
  expect([via.part, via.pin, via.kind, via.side]).toEqual(["", "", "via", "both"]);
  expect([via.xMm, via.yMm]).toEqual([37.846, 3.683]);
  expect(via.holeMm).toBeNull();
  expect(reading.warnings).toEqual([{ line: 2, reason: expect.stringContaining("0.061\u202fmm cannot be drilled") }]);
});

test("a surface pad in steps of 0.001 mm, its net by an alias, its mask in column 72 (real, CUST 1)", () => {
  const { netlist, warnings } = readIpcD356(
    file(
      "C  exported",
      "P  UNITS CUST 1",
      "P  NNAME1  a long name with blanks",
      "327NNAME1           Q1    -3         PA01X 075885Y 056515X0600Y1500R270 S0",
      "327NNAME1           Q1    -2         PA01X 075885Y 056515X0600Y1500R270S2",
      "999",
    ),
  );
  const [net] = netlist.nets;
  expect(net?.name).toBe("a long name with blanks");
  expect(net?.points[0]).toMatchObject({ part: "Q1", pin: "3", kind: "surface", side: "primary", isPlated: null });
  expect(net?.points[0]).toMatchObject({ xMm: 75.885, yMm: 56.515, padWidthMm: 0.6, padHeightMm: 1.5, turnDeg: 270 });
  expect(net?.points.map(({ mask }) => mask)).toEqual(["none", "secondary"]);
  expect(warnings).toEqual([]);
});

test.each([
  ["P  UNITS CUST", 25.4],
  ["P  UNITS CUST 0", 25.4],
  ["P  UNITS CUST 1", 10],
  ["P  UNITS CUST 2", 25.4],
  ["P  UNITS SI", 10],
])("under “%s” the figure 010000 is %s mm (read in three readers)", (header, mm) => {
  const reading = readIpcD356(file(header, "327A                U1    -1          A01X+010000Y+000000", "999"));
  expect(onlyPoint(reading).xMm).toBe(mm);
});

test("CUST 2 is asked about, with the size that comes of it; one's own choice of units ends the question", () => {
  const text = file(
    "P  UNITS CUST 2",
    "327A                U1    -1          A01X+000000Y+000000",
    "327A                U2    -1          A01X+100000Y+050000",
    "999",
  );
  expect(readIpcD356(text).warnings[0]?.reason).toContain("254 × 127\u202fmm");
  const chosen = readIpcD356(text, { scale: "0.00001 inch" });
  expect(chosen.warnings).toEqual([]);
  expect(chosen.netlist.nets[0]?.points[1]).toMatchObject({ xMm: 25.4, yMm: 12.7 });
});

test("a corrupt negative place is rejected with its line number (real: X+-01940)", () => {
  const reading = inches("327A                U1    -1          A01X+-01940Y+000100X0600Y0000R000 S0");
  expect(reading.netlist.nets).toEqual([]);
  expect(reading.passedOver).toEqual([{ line: 2, reason: expect.stringContaining("“X+-01940” stands there") }]);
});

test.each([
  ["X-001940Y+000100", -4.9276, 0.254],
  ["X 001940Y 000100", 4.9276, 0.254],
  ["X   1940Y    100", 4.9276, 0.254],
  ["X  -1940Y    100", -4.9276, 0.254],
  ["X-  1940Y-   100", -4.9276, -0.254],
  ["X-000000Y+000000", 0, 0],
])("signs may be blank and digits blank filled: %s", (place, xMm, yMm) => {
  const point = onlyPoint(inches(`327A                U1    -1          A01${place}`));
  expect([point.xMm, point.yMm]).toEqual([xMm, yMm]);
  expect(Object.is(point.xMm, -0)).toBe(false);
});

test("N/C and a blank name are no net (read)", () => {
  const { netlist } = inches(
    "317N/C              J4    -1    D0330PA00X 012447Y 008030X0000          S1",
    "317                 J4    -M2   D0330PA00X 013447Y 008030X0000          S1",
  );
  expect(netlist.nets).toEqual([]);
  expect(netlist.unconnected.map(({ pin, mask }) => [pin, mask])).toEqual([
    ["1", "primary"],
    ["M2", "primary"],
  ]);
});

test("a net's name may hold blanks, a pin may be a sign, M in column 32 marks a mid-point (read)", () => {
  const { netlist } = inches(
    "327RESET LINE       C1    --          A01X+000000Y+000000",
    "327RESET LINE       C1    -+          A01X+001000Y+000000",
    "317RESET LINE       VIA        MD0200PA00X+002000Y+000000",
  );
  expect(netlist.nets.map(({ name }) => name)).toEqual(["RESET LINE"]);
  expect(netlist.nets[0]?.points.map(({ pin, isMidPoint }) => [pin, isMidPoint])).toEqual([
    ["-", false],
    ["+", false],
    ["", true],
  ]);
});

test("aliases in comments name nets, too (read in one writer)", () => {
  const { netlist } = inches(
    "C  NNAMEm0000 memory address strobe of the second bank",
    "327NNAMEm0000       U1    -1          A01X+000000Y+000000",
  );
  expect(netlist.nets[0]?.name).toBe("memory address strobe of the second bank");
});

test("the highest layer that a point is reached from is the secondary side; those between are out of reach (read)", () => {
  const { netlist } = inches(
    "327A                U1    -1          A01X+000000Y+000000",
    "327A                U2    -1          A04X+001000Y+000000",
    "307A                VIA         D0100PA02X+002000Y+000000               S3L02L03",
    "307A                VIA         D0100PA01X+003000Y+000000               S0L01L02",
  );
  expect(netlist.nets[0]?.points.map(({ kind, side }) => [kind, side])).toEqual([
    ["surface", "primary"],
    ["surface", "secondary"],
    ["via", "inner"],
    ["via", "primary"],
  ]);
});

test("continuations add the hole and the other side to the point before them (read)", () => {
  const reading = inches(
    "317NET1             U7    -3          A01X+009750Y+062880X0380Y0000       S0",
    "017NET1             U7    -3          A04X+009750Y+062880X0380Y0000       S0",
    "017NET1                         D0200PA00X+009750Y+062880",
  );
  expect(onlyPoint(reading)).toMatchObject({ side: "both", holeMm: 0.508, isPlated: true, padWidthMm: 0.9652 });
  expect(onlyPoint(reading).padHeightMm).toBeNull();
});

test("neighbours of 379 go on in 079 and are pairs of nets, by their full names (read)", () => {
  const { netlist, warnings } = inches(
    "P  NNAME1  ADDRESS STROBE DELAYED",
    "327NNAME1           U1    -1          A01X+000000Y+000000",
    "327B                U1    -2          A01X+001000Y+000000",
    "327C                U1    -3          A01X+002000Y+000000",
    "379B NNAME1 C",
    "079NNAME1 NOWHERE",
  );
  expect(netlist.adjacent).toEqual([
    { one: "ADDRESS STROBE DELAYED", other: "B" },
    { one: "B", other: "C" },
  ]);
  expect(warnings).toEqual([{ line: 7, reason: expect.stringContaining("NOWHERE") }]);
});

test("an outline begins with the size of its pen, leaves out an axis that stays, and an asterisk lifts the pen (read)", () => {
  const { netlist } = inches(
    "389BOARD_EDGE         X100 X000000Y000000 X+010000 Y+005000 X000000",
    "089Y0*X+002000Y+002000 Y+003000",
    "389SCORE_LINE         X000000Y000000 X+010000",
  );
  expect(netlist.outlines).toEqual([
    {
      kind: "board",
      paths: [
        [
          { xMm: 0, yMm: 0 },
          { xMm: 25.4, yMm: 0 },
          { xMm: 25.4, yMm: 12.7 },
          { xMm: 0, yMm: 12.7 },
          { xMm: 0, yMm: 0 },
        ],
        [
          { xMm: 5.08, yMm: 5.08 },
          { xMm: 5.08, yMm: 7.62 },
        ],
      ],
    },
    {
      kind: "score",
      paths: [
        [
          { xMm: 0, yMm: 0 },
          { xMm: 25.4, yMm: 0 },
        ],
      ],
    },
  ]);
});

test("tooling holes stand apart; tracks, marks and the mask's clearances are counted, not kept (read)", () => {
  const { netlist, read } = inches(
    "347                             D1250UA00X+001000Y+002000",
    "378NET1           L01 X150 X40000Y250000 Y275000",
    "078X50000",
    "390MARK_PASS      L01 X+001000Y+001000 X0100X0100",
    "099NET1              P                T01X+009750Y+063380 Z+000000",
  );
  expect(netlist.toolingHoles).toEqual([{ xMm: 2.54, yMm: 5.08, holeMm: 3.175, line: 2 }]);
  expect(read).toContainEqual({ what: "records of tracks, not kept", count: 2 });
});

test("an unplated hole is told by its U, in 317 as in 367 (read)", () => {
  const { netlist } = inches(
    "317A                MH1   -1    D1250UA00X+001000Y+002000",
    "367N/C              MH2   -1    D1250UA00X+001000Y+002000",
  );
  expect(netlist.nets[0]?.points[0]?.isPlated).toBe(false);
  expect(netlist.unconnected[0]?.isPlated).toBe(false);
});

test("a part's name of more than six letters pushes the columns aside; the point is read by its letters (real)", () => {
  const reading = inches("317SCL              COMMUNICATION-1    D 400PA00X  34000Y  20000X 600Y1200R270");
  expect(onlyPoint(reading)).toMatchObject({ part: "COMMUNICATION", pin: "1", holeMm: 1.016, xMm: 86.36, yMm: 50.8 });
  expect(onlyPoint(reading)).toMatchObject({ padWidthMm: 1.524, padHeightMm: 3.048, turnDeg: 270 });
  expect(reading.warnings).toEqual([{ line: 2, reason: expect.stringContaining("shifted by 7") }]);
});
