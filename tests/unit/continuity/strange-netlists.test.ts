import fc from "fast-check";
import { expect, test } from "vitest";
import {
  findContinuityFaults,
  followUpProbes,
  planProbes,
  PROBE_LIMIT_CLASSES,
  pointBook,
} from "@/lib/calc/continuity";
import { readIpcD356 } from "@/lib/calc/netlist";
import { boardOf } from "../../support/simulated-board";

const [limits] = PROBE_LIMIT_CLASSES;
if (!limits) throw new Error("There are no limits.");

const record = fc
  .tuple(
    fc.constantFrom("317", "327", "307", "367"),
    fc.constantFrom("GND", "+5V", "A", "", "NNAME1", "N/C"),
    fc.constantFrom("U1", "VIA", "J1", ""),
    fc.constantFrom("1", "2", "a4", "", "-"),
    fc.constantFrom("A00", "A01", "A04", "   "),
    fc.constantFrom("X+000000Y+000000", "X 999999Y-999999", "X+000100Y+000100", "                "),
    fc.constantFrom("X0600Y0600R045", "X9999", "X0000Y0000R999", ""),
  )
  .map(
    ([code, net, part, pin, access, place, size]) =>
      `${code}${net.padEnd(14)}   ${part.padEnd(6)}-${pin.padEnd(4)}       ${access}${place}${size}`,
  );

test("whatever a file holds can be planned and answered at random, without a crash and without a figure that is none", () => {
  fc.assert(
    fc.property(
      fc.array(record, { maxLength: 25 }),
      fc.record({
        populated: fc.boolean(),
        vias: fc.boolean(),
        unconnected: fc.boolean(),
        railsOnly: fc.boolean(),
        neighbourMm: fc.constantFrom(1.27, 0, -1, Number.NaN, 1e9),
      }),
      fc.option(fc.constantFrom("J1", "j1", ""), { nil: undefined }),
      fc.infiniteStream(fc.constantFrom(true, false, null, 0, 50, 5e3, 1e9, Infinity, Number.NaN)),
      (lines, options, connector, answers) => {
        const { netlist } = readIpcD356(["P  UNITS CUST 0", "379A GND +5V", ...lines, "999"].join("\n"));
        const plan = planProbes(netlist, { ...options, limits, ...(connector === undefined ? {} : { connector }) });
        const { points } = pointBook(netlist);
        expect(Number.isNaN(plan.travelMm)).toBe(false);
        expect(plan.saved).toBeGreaterThanOrEqual(0);
        const results = plan.probes.map(({ id, a, b }) => {
          expect(a !== b && points[a] !== undefined && points[b] !== undefined).toBe(true);
          const { value } = answers.next();
          return typeof value === "number"
            ? { probe: id, beeps: null, ohm: value }
            : { probe: id, beeps: value, ohm: null };
        });
        const more = followUpProbes(netlist, plan.probes, results);
        const { findings } = findContinuityFaults(netlist, [...plan.probes, ...more], results);
        for (const { sentence, lookAt, nets } of findings) {
          expect(`${sentence} ${lookAt}`).not.toMatch(/undefined|NaN|no point/);
          expect(nets.length).toBeGreaterThan(0);
        }
      },
    ),
    { numRuns: 300 },
  );
});

test("results of another plan, and probes of another netlist, find nothing and break nothing", () => {
  const netlist = boardOf([
    { net: "A", xMm: 0, yMm: 0 },
    { net: "A", xMm: 5, yMm: 0 },
  ]);
  const { probes } = planProbes(netlist, { populated: false, limits });
  const strange = [
    ...probes,
    { id: 7, kind: "isolation" as const, a: 0, b: 99, expect: "apart" as const, limitOhm: 1e6 },
  ];
  const report = findContinuityFaults(netlist, strange, [
    { probe: 7, beeps: true, ohm: null },
    { probe: 400, beeps: false, ohm: null },
  ]);
  expect(report.findings).toEqual([]);
});

test("thousands of nets on one spot are planned within bounds, and that is said", () => {
  const heap = boardOf(Array.from({ length: 3000 }, (_, at) => ({ net: `N${at}`, xMm: 1, yMm: 1 })));
  const { counts, remarks } = planProbes(heap, { populated: false, limits });
  expect(counts.isolation).toBeGreaterThan(0);
  expect(counts.isolation).toBeLessThanOrEqual(40 * 3000 + 1000);
  expect(remarks.join(" ")).toContain("Very many pads lie on one spot");
});
