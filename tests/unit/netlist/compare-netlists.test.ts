import fc from "fast-check";
import { expect, test } from "vitest";
import { compareNetlists } from "@/lib/calc/netlist";
import { netlistOf } from "../../support/small-netlists";

const NOTHING = { gained: [], lost: [], renamed: [], moved: [], pinsGained: [], pinsLost: [] };

test("nothing changed: nothing is said", () => {
  const one = netlistOf({ A: ["U1-1", "U2-1"], B: ["U1-2"] });
  expect(compareNetlists(one, one)).toEqual(NOTHING);
});

test("a net with the same pins under another name was renamed, and no pin moved", () => {
  const before = netlistOf({ "Net-(U1-1)": ["U1-1", "U2-1"], B: ["U1-2"] });
  const after = netlistOf({ CLK: ["U2-1", "U1-1"], B: ["U1-2"] });
  expect(compareNetlists(before, after)).toEqual({ ...NOTHING, renamed: [{ from: "Net-(U1-1)", to: "CLK" }] });
});

test("two nets that exchange their names are two renamed nets", () => {
  const before = netlistOf({ A: ["U1-1", "U2-1"], B: ["U1-2", "U2-2"] });
  const after = netlistOf({ B: ["U1-1", "U2-1"], A: ["U1-2", "U2-2"] });
  expect(compareNetlists(before, after)).toEqual({
    ...NOTHING,
    renamed: [
      { from: "A", to: "B" },
      { from: "B", to: "A" },
    ],
  });
});

test("gained and lost nets, gained and lost pins, and pins that change their net", () => {
  const before = netlistOf({ A: ["U1-1", "U2-1", "U3-1"], OLD: ["U5-1"] });
  const after = netlistOf({ A: ["U1-1", "U2-1"], NEW: ["U3-1", "U6-1"] });
  expect(compareNetlists(before, after)).toEqual({
    gained: ["NEW"],
    lost: ["OLD"],
    renamed: [],
    moved: [{ pin: "U3-1", from: "A", to: "NEW" }],
    pinsGained: [{ pin: "U6-1", net: "NEW" }],
    pinsLost: [{ pin: "U5-1", net: "OLD" }],
  });
});

test("a pin that loses its net, or gets one", () => {
  const [joined, alone] = [netlistOf({ A: ["U1-1", "U2-1"] }), netlistOf({ A: ["U1-1"] }, ["U2-1"])];
  expect(compareNetlists(joined, alone).moved).toEqual([{ pin: "U2-1", from: "A", to: null }]);
  expect(compareNetlists(alone, joined).moved).toEqual([{ pin: "U2-1", from: null, to: "A" }]);
});

const PINS = ["U1-1", "U1-2", "U2-1", "U2-2", "U3-1"];
const shuffledInto = fc.tuple(...PINS.map(() => fc.constantFrom("A", "B", "C", "none", "absent"))).map((where) => {
  const pinsOf = (name: string) => PINS.filter((_, at) => where[at] === name);
  const nets = Object.fromEntries(
    ["A", "B", "C"].map((name) => [name, pinsOf(name)]).filter(([, pins]) => pins?.length),
  );
  return netlistOf(nets, pinsOf("none"));
});

test("looked at from the other end, what was gained was lost", () => {
  fc.assert(
    fc.property(shuffledInto, shuffledInto, (one, other) => {
      const [there, back] = [compareNetlists(one, other), compareNetlists(other, one)];
      const sorted = <T>(list: readonly T[]) => list.map((item) => JSON.stringify(item)).sort();
      expect(sorted(there.pinsGained)).toEqual(sorted(back.pinsLost));
      expect(sorted(there.renamed)).toEqual(sorted(back.renamed.map(({ from, to }) => ({ from: to, to: from }))));
      if (there.renamed.length === 0) {
        expect(sorted(there.gained)).toEqual(sorted(back.lost));
        expect(there.moved.map(({ pin }) => pin).sort()).toEqual(back.moved.map(({ pin }) => pin).sort());
      }
    }),
  );
});
