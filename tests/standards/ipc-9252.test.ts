import { expect, test } from "vitest";
import {
  effectiveLimits,
  estimateTime,
  isolationWays,
  planProbes,
  PROBE_LIMIT_CLASSES,
  type LimitClass,
  type PlanOptions,
} from "@/lib/calc/continuity";
import type { DesignPin } from "@/lib/calc/interconnect";
import { netlistOfDesign, type Netlist } from "@/lib/calc/netlist";
import { face } from "../support/face";
import { netlistOf } from "../support/small-netlists";

/*
 * IPC-9252, electrical test of unpopulated boards. The standard was not opened: class 3 and 3/A were read in trade articles,
 * classes 1 and 2 are from memory, the window of 0.050 inch was read as accepted practice; counts are arithmetic.
 */

const limitsOf = (name: LimitClass) => {
  const limits = PROBE_LIMIT_CLASSES.find((one) => one.class === name);
  if (!limits) throw new Error(`There is no class ${name}.`);
  return limits;
};

const bare: PlanOptions = { populated: false, limits: limitsOf("3") };

test("class 3: joined is at most 10 Ω, apart at least 10 MΩ, at 40 V or more (read)", () => {
  expect(limitsOf("3")).toEqual({ class: "3", continuityOhm: 10, isolationOhm: 10e6, testVolts: 40 });
  const { probes } = planProbes(netlistOf({ GND: ["U1-1", "U2-1"], "+5V": ["U1-2"] }), bare);
  expect(probes.map(({ kind, expect: expected, limitOhm }) => [kind, expected, limitOhm])).toEqual([
    ["continuity", "joined", 10],
    ["isolation", "apart", 10e6],
  ]);
});

test("class 3/A: at most 10 Ω, at least 100 MΩ, at 250 V or more (read)", () => {
  expect(limitsOf("3/A")).toEqual({ class: "3/A", continuityOhm: 10, isolationOhm: 100e6, testVolts: 250 });
});

test("classes 1 and 2: at most 50 Ω, at least 0.5 and 2 MΩ (from memory)", () => {
  expect(
    [limitsOf("1"), limitsOf("2")].map(({ continuityOhm, isolationOhm }) => [continuityOhm, isolationOhm]),
  ).toEqual([
    [50, 0.5e6],
    [50, 2e6],
  ]);
});

test("with parts fitted the standard does not hold: isolation says no more than 100 Ω, one's own limit is kept (common practice)", () => {
  expect(effectiveLimits(limitsOf("3"), true)).toMatchObject({ continuityOhm: 10, isolationOhm: 100, testVolts: null });
  expect(effectiveLimits({ ...limitsOf("3"), class: "own", isolationOhm: 5000 }, true).isolationOhm).toBe(5000);
  const { caution } = planProbes(netlistOf({ A: ["U1-1", "U2-1"] }), { ...bare, populated: true });
  expect(caution).toContain("power off");
  expect(planProbes(netlistOf({ A: ["U1-1", "U2-1"] }), bare).caution).toBeNull();
});

test("96 pins in 20 nets take 76 continuity tests; isolation takes 190 by pairs, 19 against the rest, 5 by halves (computed)", () => {
  const nets = Array.from({ length: 20 }, (_, net) => net);
  const pins = Object.fromEntries(
    nets.map((net) => [`N${net}`, Array.from({ length: net < 16 ? 5 : 4 }, (_, pin) => `U${net}-${pin + 1}`)]),
  );
  const { counts, everyPair } = planProbes(netlistOf(pins), bare);
  expect(counts).toMatchObject({ nets: 20, points: 96, continuity: 76 });
  expect(everyPair).toBe(190);
  expect(isolationWays(20)).toEqual({ everyPair: 190, againstTheRest: 19, inHalves: 5 });
});

const pin = (name: string, signal: string): DesignPin => ({
  pin: name,
  signal,
  role: "passive",
  family: "",
  loads: 0,
  enableGroup: "",
  pullUpOhm: null,
});

function straightThrough(references: readonly string[]): Netlist {
  const c96 = face("din41612-c96");
  const pins = c96.pins.map(({ name }) => pin(name, `S${name}`));
  return netlistOfDesign({
    connectors: references.map((reference) => ({ id: reference, reference, face: c96, pins })),
  });
}

test("two 96-pin connectors straight through: 192 points, 96 nets, 96 continuity, 4560 pairs, 95, 7 (computed)", () => {
  const { counts, everyPair, saved } = planProbes(straightThrough(["X1", "X2"]), bare);
  expect(counts).toMatchObject({ nets: 96, points: 192, continuity: 96 });
  expect(everyPair).toBe(4560);
  expect(isolationWays(96)).toEqual({ everyPair: 4560, againstTheRest: 95, inHalves: 7 });
  // The neighbours on both connectors are the same pairs of nets.
  expect([counts.isolation, saved]).toEqual([157, 4560 - 157]);
});

test("3 × 32 pins at 2.54 mm: 93 pairs along the rows and 64 across, with the diagonals 281 (computed)", () => {
  const netlist = straightThrough(["X1"]);
  expect(planProbes(netlist, bare).counts.isolation).toBe(93 + 64);
  expect(planProbes(netlist, { ...bare, neighbourMm: 1.4 }).counts.isolation).toBe(157 + 124);
});

test("the 1.27 mm lie between edges: pins at 2.54 mm with pads of 1.6 mm are 0.94 mm apart and count (read)", () => {
  const netlist = straightThrough(["X1"]);
  expect(planProbes(netlist, { ...bare, neighbourMm: 0.941 }).counts.isolation).toBe(157);
  expect(planProbes(netlist, { ...bare, neighbourMm: 0.939 }).counts.isolation).toBe(0);
});

test("time is the number of probes at one's own pace", () => {
  const plan = planProbes(straightThrough(["X1", "X2"]), bare);
  expect(estimateTime(plan, 4)).toBe((96 + 157) * 4);
  expect(estimateTime(plan, Number.NaN)).toBe(0);
});
