import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { backplaneRail, type PoweredPlacement } from "@/lib/calc/power";
import { card, LINE, powerOf } from "./machine";

describe("the drop along the backplane", () => {
  const dropsOf = (placements: PoweredPlacement[], line = LINE) =>
    powerOf({ placements, backplane: [line] }).drops.map(({ slot, dropV }) => [slot, Number(dropV.toPrecision(9))]);

  test("every piece of copper carries all that flows beyond it", () => {
    // computed: 3 A, 2 A, 1 A in the three pieces of 20 mΩ there and back
    expect(dropsOf([card(1, 1), card(2, 1), card(3, 1)])).toEqual([
      [1, 0.06],
      [2, 0.1],
      [3, 0.12],
    ]);
  });

  test("empty slots are copper too", () => {
    expect(dropsOf([card(4, 1)])).toEqual([[4, 0.08]]);
  });

  test("a source in the middle feeds both sides apart", () => {
    expect(dropsOf([card(1, 1), card(3, 0.5), card(4, 1)], { ...LINE, sourceSlot: 3 })).toEqual([
      [1, 0.04],
      [3, 0],
      [4, 0.02],
    ]);
  });

  test("contacts lose there and back: 3 A over 6 and 6 of 20 mΩ are 20 mV (computed)", () => {
    const six = card(1, 3, { contacts: { rails: [{ rail: "+5V", count: 6 }], ground: 6 } });
    expect(dropsOf([six], { ...LINE, supplyOhm: 0, groundOhm: 0, contactOhm: 0.02 })).toEqual([[1, 0.02]]);
  });

  test("a card that gets less than the tolerance allows is told what is the least", () => {
    const [drop] = powerOf({ placements: [card(10, 2)], backplane: [LINE] }).drops;
    expect(drop).toMatchObject({ verdict: "too low", volts: 4.6 });
    expect(drop?.sentence).toBe(
      "Slot 10 gets 4.6\u202fV of +5V, 400\u202fmV lost on the way: 4.75\u202fV is the least.",
    );
  });

  test("a rail's copper gives its resistance by length and width", () => {
    const line = backplaneRail("+5V", 0, { segmentMm: 20, widthMm: 2, copperUm: 35, groundWidthMm: 10 }, 20);
    if (!line.ok) throw new Error(line.message);
    // computed from the sheet resistance of 35 µm, 0.49143 mΩ: 10 squares and 2 squares
    expect(line.value.supplyOhm).toBeCloseTo(4.9143e-3, 7);
    expect(line.value.groundOhm).toBeCloseTo(0.98286e-3, 7);
    expect(backplaneRail("+5V", 0, { segmentMm: 20, widthMm: 0, copperUm: 35 }, 20).ok).toBe(false);
  });

  test("is the same as solving the ladder piece by piece, whatever is plugged in", () => {
    const currents = fc.array(fc.double({ min: 0, max: 3, noNaN: true }), { minLength: 1, maxLength: 20 });
    fc.assert(
      fc.property(currents, (amps) => {
        const drops = dropsOf(amps.map((worst, index) => card(index + 1, worst)));
        let volts = 0;
        const ladder = amps.map((worst, index) => {
          volts += 0.02 * amps.slice(index).reduce((sum, beyond) => sum + beyond, 0);
          return [index + 1, worst === 0 ? null : volts] as const;
        });
        for (const [slot, dropV] of drops) expect(dropV).toBeCloseTo(ladder.find(([at]) => at === slot)?.[1] ?? NaN, 6);
      }),
    );
  });
});
