import { expect, test } from "vitest";
import { isRailName, planProbes, PROBE_LIMIT_CLASSES, pointBook, type PlanOptions } from "@/lib/calc/continuity";
import { readIpcD356, type Netlist } from "@/lib/calc/netlist";
import { netlistOf } from "../../support/small-netlists";

const [limits] = PROBE_LIMIT_CLASSES;
if (!limits) throw new Error("There are no limits.");
const bare: PlanOptions = { populated: false, limits };

/** "U1-1 U2-1" of every probe of one kind, the two in the order of their names. */
function probed(netlist: Netlist, kind: string, options: Partial<PlanOptions> = {}): string[] {
  const { label } = pointBook(netlist);
  return planProbes(netlist, { ...bare, ...options })
    .probes.filter((probe) => probe.kind === kind)
    .map(({ a, b }) => [label(a), label(b)].sort().join(" "))
    .sort();
}

const BOARD = netlistOf({
  GND: ["J1-1", "U1-7", "U2-7"],
  "+5V": ["J1-2", "U1-14", "U2-14"],
  "-12V": ["J1-9"],
  CLK: ["J1-3", "U1-1"],
  DATA: ["J1-4", "U1-2", "U2-2"],
  OWN: ["U1-3", "U2-3"],
});

test("rails are held against each other wherever they lie; others only where their pins stand beside each other", () => {
  expect(probed(BOARD, "isolation")).toEqual([
    "J1-1 J1-2",
    "J1-1 J1-3",
    "J1-1 J1-9",
    "J1-2 J1-3",
    "J1-2 J1-4",
    "J1-2 J1-9",
    "J1-3 J1-4",
    "U1-2 U1-3",
  ]);
});

test.each([
  ["+5V", "+12 V", "-5V", "3V3", "5V0", "GND", "AGND", "GNDA", "VCC", "VDD_IO", "VSS", "0V", "/power/+5V", "VEE"],
])("supplies and grounds are told by their names: %s …", (...names) => {
  for (const name of names) expect([name, isRailName(name)]).toEqual([name, true]);
  for (const name of ["CLK", "D5", "VALID", "V", "5", "GRANT", "DV", "SEL5V", ""])
    expect([name, isRailName(name)]).toEqual([name, false]);
});

test("only the rails, with those that the project names", () => {
  expect(probed(BOARD, "continuity", { railsOnly: true })).toEqual([
    "J1-1 U1-7",
    "J1-2 U1-14",
    "U1-14 U2-14",
    "U1-7 U2-7",
  ]);
  expect(probed(BOARD, "isolation", { railsOnly: true })).toEqual(["J1-1 J1-2", "J1-1 J1-9", "J1-2 J1-9"]);
  expect(probed(BOARD, "isolation", { railsOnly: true, rails: ["own"] })).toHaveLength(6);
});

test("only signals that a rework touched, and what lies beside them", () => {
  const signals = ["data"];
  expect(probed(BOARD, "continuity", { signals })).toEqual(["J1-4 U1-2", "U1-2 U2-2"]);
  expect(probed(BOARD, "isolation", { signals })).toEqual(["J1-2 J1-4", "J1-3 J1-4", "U1-2 U1-3"]);
  const plan = planProbes(BOARD, { ...bare, signals });
  expect([plan.everyPair, plan.saved]).toEqual([5, 2]);
  expect(planProbes(BOARD, { ...bare, signals: ["NOWHERE"] })).toMatchObject({
    probes: [],
    remarks: expect.arrayContaining(["None of these signals is a net of the netlist under this name."]),
  });
});

test("only one connector: each of its pins to one other point of its net, and its pins against each other", () => {
  expect(probed(BOARD, "continuity", { connector: "j1" })).toEqual([
    "J1-1 U1-7",
    "J1-2 U1-14",
    "J1-3 U1-1",
    "J1-4 U1-2",
  ]);
  const isolation = probed(BOARD, "isolation", { connector: "J1" });
  expect(isolation).toHaveLength(7);
  expect(isolation.join(" ")).not.toContain("U");
  expect(planProbes(BOARD, { ...bare, connector: "J9" }).remarks).toEqual(["No point of the netlist belongs to J9."]);
});

test("pins of a package are counted along its edge, those of a connector across two rows, those of a grid both ways", () => {
  const single = (...pins: string[]) => netlistOf(Object.fromEntries(pins.map((name, at) => [`N${at}`, [name]])));
  expect(probed(single("U1-1", "U1-2", "U1-3"), "isolation")).toEqual(["U1-1 U1-2", "U1-2 U1-3"]);
  expect(probed(single("J1-1", "J1-2", "J1-3"), "isolation")).toEqual(["J1-1 J1-2", "J1-1 J1-3", "J1-2 J1-3"]);
  expect(probed(single("U1-A1", "U1-A2", "U1-B1", "U1-C2"), "isolation")).toEqual(["U1-A1 U1-A2", "U1-A1 U1-B1"]);
  // Row I is left out of most packages.
  expect(probed(single("U1-H4", "U1-J4"), "isolation")).toEqual(["U1-H4 U1-J4"]);
  expect(probed(single("X1-a1", "X1-c1"), "isolation")).toEqual([]);
  expect(probed(single("X1-D", "X1-E"), "isolation")).toEqual(["X1-D X1-E"]);
});

const LAYOUT = readIpcD356(
  [
    "P  UNITS CUST 0",
    "317A                U1    -1    D0320PA00X+000000Y+000000X0600Y0000R000 S0",
    "317A                VIA         D0120PA00X+010000Y+000000X0250Y0000R000 S3",
    "307A                VIA         D0100P   X+011000Y+000000               S3L02L03",
    "317A                U2    -1    D0320PA00X+020000Y+000000X0600Y0000R000 S0",
    "317B                U1    -2    D0320PA00X+000000Y+010000X0600Y0000R000 S0",
    "317N/C              U1    -3    D0320PA00X+000000Y+011000X0600Y0000R000 S0",
    "327B                U3    -1          A04X+020000Y+010000X0600Y0600R000 S0",
    "379A B",
    "999",
  ].join("\n"),
).netlist;

test("vias are probed when asked for, points inside the board never, unconnected pads when asked for", () => {
  expect(probed(LAYOUT, "continuity")).toEqual(["U1-1 U2-1", "U1-2 U3-1"]);
  expect(probed(LAYOUT, "continuity", { vias: true })).toHaveLength(3);
  expect(probed(LAYOUT, "isolation", { unconnected: true })).toContain("U1-2 U1-3");
  expect(planProbes(LAYOUT, bare).remarks).toEqual([
    "1 via or mid-point between the ends of nets: not probed.",
    "1 point inside the board: out of reach.",
    "1 pad without a net: not probed.",
    expect.stringContaining("A buzzer finds shorts"),
  ]);
});

test("nets that the file names as neighbours are held against each other, however far their pads lie apart", () => {
  expect(probed(LAYOUT, "isolation")).toEqual(["U1-1 U1-2"]);
});

test("the way of the tips is known where places are", () => {
  expect(planProbes(LAYOUT, bare).travelMm).toBeGreaterThan(0);
  expect(planProbes(BOARD, bare).travelMm).toBeNull();
});

test("hundreds of nets that look like rails are not all held against each other", () => {
  const rails = netlistOf(Object.fromEntries(Array.from({ length: 300 }, (_, at) => [`VCC${at}`, [`U${at}-1`]])));
  const { counts, remarks } = planProbes(rails, bare);
  expect(counts.isolation).toBe((40 * 39) / 2);
  expect(remarks.join(" ")).toContain("300 nets look like rails");
});
