import { expect, test } from "vitest";
import {
  findContinuityFaults,
  followUpProbes,
  planProbes,
  PROBE_LIMIT_CLASSES,
  pointBook,
  type ProbeResult,
} from "@/lib/calc/continuity";
import type { Netlist } from "@/lib/calc/netlist";
import { netlistOf } from "../../support/small-netlists";

const class3 = PROBE_LIMIT_CLASSES.find((one) => one.class === "3");
if (!class3) throw new Error("There is no class 3.");
const limits = class3;

/** Everything reads as it should, except for the pairs that are named: true joins them, false parts them, a number is Ω. */
function probe(netlist: Netlist, readings: Record<string, boolean | number> = {}, populated = false) {
  const { label } = pointBook(netlist);
  const { probes } = planProbes(netlist, { populated, limits });
  const unused = new Set(Object.keys(readings));
  const results = probes.map(({ id, a, b, expect: expected }): ProbeResult => {
    const name = [label(a), label(b)].sort().join(" ");
    const reading = readings[name] ?? expected === "joined";
    unused.delete(name);
    return typeof reading === "number"
      ? { probe: id, beeps: null, ohm: reading }
      : { probe: id, beeps: reading, ohm: null };
  });
  expect([...unused]).toEqual([]);
  return { probes, results, report: findContinuityFaults(netlist, probes, results) };
}

const CABLE = netlistOf({ D0: ["J1-1", "J2-1"], D1: ["J1-2", "J2-2"], D2: ["J1-3", "J2-3"] });

test("an open net says between which points, which piece is which, and where to look", () => {
  const { report } = probe(netlistOf({ CLK: ["U1-1", "U2-1", "U3-1", "U4-1"] }), { "U3-1 U4-1": false });
  expect(report.findings).toEqual([
    {
      kind: "open",
      nets: ["CLK"],
      pieces: [[0, 1, 2], [3]],
      pins: ["U3-1", "U4-1"],
      probes: [2],
      sentence: "CLK is open between U3-1 and U4-1: U1-1, U2-1 and U3-1 | U4-1.",
      lookAt: "Look at the joint of U4-1 first, then along the track to it.",
      mendFirst: "",
    },
  ]);
});

test("a net in very many pieces is still one sentence that one can read", () => {
  const pins = Array.from({ length: 40 }, (_, at) => `U${at + 1}-1`);
  const cut = Object.fromEntries(pins.slice(1).map((pin, at) => [[pins[at], pin].sort().join(" "), false]));
  const [finding] = probe(netlistOf({ CLK: pins }), cut).report.findings;
  expect(finding?.pieces).toHaveLength(40);
  expect(finding?.sentence).toBe(
    "CLK is open between U1-1 and U2-1, between U2-1 and U3-1, between U3-1 and U4-1 and at 36 more places: U1-1 | U2-1 | U3-1 | and 37 more.",
  );
});

test("nets that touch are one finding, however many they are, with the joint that is most likely bridged", () => {
  const netlist = netlistOf({ A: ["U1-1"], B: ["U1-2"], C: ["U1-3"], D: ["U1-4"] });
  const { report } = probe(netlist, { "U1-1 U1-2": true, "U1-2 U1-3": 0.4 });
  expect(report.findings).toEqual([
    expect.objectContaining({
      kind: "short",
      nets: ["A", "B", "C"],
      sentence: "A, B and C touch: copper joins U1-1 and U1-2; U1-2 and U1-3.",
      lookAt: "Look for a bridge of solder between U1-1 and U1-2.",
    }),
  ]);
});

test("a joint that reads 23 Ω is no open but high; two nets that read 1.2 MΩ leak", () => {
  const { report } = probe(CABLE, { "J1-1 J2-1": 23, "J1-2 J1-3": 1.2e6 });
  expect(report.findings.map(({ kind, nets, sentence }) => [kind, nets, sentence])).toEqual([
    ["high resistance", ["D0"], "D0: J1-1 to J2-1 reads 23\u202fΩ; it should be at most 10\u202fΩ."],
    ["leak", ["D1", "D2"], "D1 against D2: J1-2 to J1-3 reads 1.2\u202fMΩ; it should be at least 10\u202fMΩ."],
  ]);
});

test("20 kΩ where copper should be is an open that a part hides; an overload is an open", () => {
  for (const ohm of [20_000, Infinity]) {
    expect(probe(CABLE, { "J1-1 J2-1": ohm }).report.findings.map(({ kind }) => kind)).toEqual(["open"]);
  }
});

test("with parts fitted a pull-up between two nets is no fault", () => {
  expect(probe(CABLE, { "J1-2 J1-3": 4700 }, true).report.findings).toEqual([]);
  expect(probe(CABLE, { "J1-2 J1-3": 12 }, true).report.findings.map(({ kind }) => kind)).toEqual(["short"]);
});

test("two open nets on one cable are asked about across, and what beeps both ways is a crossed pair", () => {
  const { probes, results, report } = probe(CABLE, { "J1-1 J2-1": false, "J1-2 J2-2": false });
  expect(report.findings.map(({ kind }) => kind)).toEqual(["open", "open"]);
  const { label } = pointBook(CABLE);
  const more = followUpProbes(CABLE, probes, results);
  const asked = more.map(({ a, b }) => `${label(a)} ${label(b)}`);
  expect(asked).toContain("J1-1 J2-2");
  expect(asked).toContain("J2-1 J1-2");
  expect(more.every(({ kind, id }, at) => kind === "follow-up" && id === probes.length + at)).toBe(true);
  const answers = more.map(({ id, a, b }): ProbeResult => {
    const isAcross = label(a).startsWith("J1") !== label(b).startsWith("J1");
    return { probe: id, beeps: isAcross, ohm: null };
  });
  const all = [...probes, ...more];
  const after = findContinuityFaults(CABLE, all, [...results, ...answers]);
  expect(after.findings).toEqual([
    expect.objectContaining({
      kind: "crossed",
      nets: ["D0", "D1"],
      pieces: [
        [0, 3],
        [1, 2],
      ],
      sentence: "D0 and D1 change places: J1-1 leads to J2-2 and J2-1 leads to J1-2.",
      lookAt: "Look at J1 or J2: the two wires are the wrong way round there.",
    }),
  ]);
  expect(followUpProbes(CABLE, all, [...results, ...answers])).toEqual([]);
});

test("three wires that are turned by one are one finding with all three", () => {
  const { probes, results } = probe(CABLE, { "J1-1 J2-1": false, "J1-2 J2-2": false, "J1-3 J2-3": false });
  const more = followUpProbes(CABLE, probes, results);
  const { label } = pointBook(CABLE);
  const turned = new Set(["J1-1 J2-2", "J1-2 J2-3", "J1-3 J2-1"]);
  const answers = more.map(({ id, a, b }): ProbeResult => ({
    probe: id,
    beeps: turned.has([label(a), label(b)].sort().join(" ")),
    ohm: null,
  }));
  const { findings } = findContinuityFaults(CABLE, [...probes, ...more], [...results, ...answers]);
  expect(findings.map(({ kind, nets }) => [kind, nets])).toEqual([["crossed", ["D0", "D1", "D2"]]]);
});

test("three wires that are cut and bridged on both ends are a short and three opens, not crossed", () => {
  const opens = { "J1-1 J2-1": false, "J1-2 J2-2": false, "J1-3 J2-3": false };
  const { probes, results } = probe(CABLE, { ...opens, "J1-1 J1-2": true, "J1-2 J1-3": true, "J1-1 J1-3": true });
  const { label } = pointBook(CABLE);
  const more = followUpProbes(CABLE, probes, results);
  const answers = more.map(({ id, a, b }): ProbeResult => ({
    probe: id,
    beeps: label(a).slice(0, 2) === label(b).slice(0, 2),
    ohm: null,
  }));
  const { findings } = findContinuityFaults(CABLE, [...probes, ...more], [...results, ...answers]);
  expect(findings.map(({ kind, nets }) => [kind, nets])).toEqual([
    ["short", ["D0", "D1", "D2"]],
    ["open", ["D0"]],
    ["open", ["D1"]],
    ["open", ["D2"]],
  ]);
});

test("an open net says which isolation means nothing yet, and a short on it waits for the open", () => {
  const { report, probes } = probe(CABLE, { "J1-1 J2-1": false, "J1-1 J1-2": true });
  const short = report.findings.find(({ kind }) => kind === "short");
  expect(short?.mendFirst).toBe(
    "Mend the open in D0 first, then probe again: until then it is known only of one piece.",
  );
  const { label } = pointBook(CABLE);
  const repeat = report.repeat
    .map((id) => probes[id])
    .map((one) => one && [label(one.a), label(one.b)].sort().join(" "));
  expect(repeat).toEqual(["J1-1 J1-3"]);
});

test("many opens at one part point to the part", () => {
  const wide = netlistOf(
    Object.fromEntries(Array.from({ length: 5 }, (_, at) => [`D${at}`, [`J1-${at + 1}`, `J2-${at + 1}`]])),
  );
  const opens = Object.fromEntries(Array.from({ length: 5 }, (_, at) => [`J1-${at + 1} J2-${at + 1}`, false]));
  expect(probe(wide, opens).report.remarks).toEqual([
    "5 nets are open at J2: see whether it is plugged in, the right way round and not a row too far.",
  ]);
});

test("without results there are no findings, and all is left; the last of several results counts", () => {
  const { probes } = planProbes(CABLE, { populated: false, limits });
  const none = findContinuityFaults(CABLE, probes, []);
  expect([none.findings, none.left]).toEqual([[], { continuity: 3, isolation: 3, "follow-up": 0 }]);
  const twice = [false, true].map((beeps): ProbeResult => ({ probe: 0, beeps, ohm: null }));
  const { findings, left } = findContinuityFaults(CABLE, probes, twice);
  expect([findings, left.continuity]).toEqual([[], 2]);
});

test("a probe that reads open although others join its points is to be probed again", () => {
  const netlist = netlistOf({ CLK: ["U1-1", "U2-1", "U3-1"] });
  const { probes, results } = probe(netlist, { "U1-1 U2-1": false });
  const bridge = { id: 2, kind: "follow-up" as const, a: 0, b: 2, expect: "joined" as const, limitOhm: 10 };
  const report = findContinuityFaults(netlist, [...probes, bridge], [...results, { probe: 2, beeps: true, ohm: null }]);
  expect(report.findings).toEqual([]);
  expect(report.remarks).toEqual(["U1-1 to U2-1 read open, but other probes join them: probe it again."]);
});
