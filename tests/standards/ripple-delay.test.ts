import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { pathDelay, rippleCarrySteps, type DelayStep } from "@/lib/calc/delay";
import { simulateAdder, type AdderInput, type GateTimes } from "../unit/delay/simulated-adder";

const NS = 1e-9;
const gateDelay = (name: string, ns: number) => ({ name, minS: null, typicalS: ns * NS, maxS: ns * NS });
const steps = (bits: number, { xor, and, or }: GateTimes) =>
  rippleCarrySteps(bits, { xor: gateDelay("XOR", xor), and: gateDelay("AND", and), or: gateDelay("OR", or) });

function nanoseconds(path: DelayStep[]): number {
  const result = pathDelay({ steps: path, derating: null, unknownMinShare: null, unknownMaxShare: null });
  if (!result.ok || result.value.worstCaseS === null) throw new Error("the path has no worst case");
  return result.value.worstCaseS / NS;
}

const HC: GateTimes = { xor: 14, and: 9, or: 9 };
const adder = (a: number, b: number, carry: boolean): AdderInput => ({ a, b, carry });

describe("ripple carry, 8 bits, XOR 14 ns, AND and OR 9 ns, computed", () => {
  const { carryOut, lastSum } = steps(8, HC);

  it("the carry out takes tX + n(tA + tO) = 158 ns, the last sum 2tX + (n − 1)(tA + tO) = 154 ns", () => {
    expect(nanoseconds(carryOut)).toBeCloseTo(158, 9);
    expect(nanoseconds(lastSum)).toBeCloseTo(154, 9);
  });

  it("simulated: a0 rising with FEh, b 00h and carry in 1 takes that long", () => {
    const took = simulateAdder(8, HC, adder(0xfe, 0x00, true), adder(0xff, 0x00, true));
    expect(took).toMatchObject({ carryOutS: 158, lastSumS: 154, carryOut: true, lastSum: false });
  });

  it("simulated: FFh + 00h to FFh + 01h is not the worst case, only 144 and 140 ns", () => {
    const took = simulateAdder(8, HC, adder(0xff, 0x00, false), adder(0xff, 0x01, false));
    expect(took).toMatchObject({ carryOutS: 144, lastSumS: 140, carryOut: true, lastSum: false });
  });
});

describe("against a simulation gate by gate", () => {
  const word = fc.integer({ min: 0, max: 255 });
  /** Operands that mostly pass the carry on, since others end the chain early. */
  const operands = fc
    .tuple(word, word, fc.boolean(), fc.constantFrom(0, 1, 2, 128))
    .map(([a, flipped, carry, odd]) => adder(a, a ^ (flipped % 4 === 0 ? flipped : 255) ^ odd, carry));

  it("no pair of inputs, random and eager to ripple, takes longer than the formula, and some take as long", () => {
    let [slowestCarry, slowestSum] = [0, 0];
    fc.assert(
      fc.property(operands, operands, (before, after) => {
        const took = simulateAdder(8, HC, before, after);
        slowestCarry = Math.max(slowestCarry, took.carryOutS);
        slowestSum = Math.max(slowestSum, took.lastSumS);
        expect(took.carryOutS).toBeLessThanOrEqual(158);
        expect(took.lastSumS).toBeLessThanOrEqual(154);
        const sum = after.a + after.b + Number(after.carry);
        expect([took.carryOut, took.lastSum]).toEqual([sum > 255, (sum & 128) !== 0]);
      }),
      { numRuns: 20_000, seed: 20261201 },
    );
    expect([slowestCarry, slowestSum]).toEqual([158, 154]);
  });

  it("the formula holds for any width and any delays of the gates", () => {
    const times = fc.record({
      xor: fc.integer({ min: 1, max: 40 }),
      and: fc.integer({ min: 1, max: 40 }),
      or: fc.integer({ min: 1, max: 40 }),
    });
    fc.assert(
      fc.property(fc.integer({ min: 2, max: 16 }), times, (bits, gates) => {
        const ones = 2 ** bits - 1;
        const took = simulateAdder(bits, gates, adder(ones - 1, 0, true), adder(ones, 0, true));
        expect(took.carryOutS).toBeCloseTo(nanoseconds(steps(bits, gates).carryOut), 6);
        expect(took.lastSumS).toBeCloseTo(nanoseconds(steps(bits, gates).lastSum), 6);
      }),
    );
  });
});
