import fc from "fast-check";
import { CHECK_STAGES, type StandingCheck } from "@/lib/calc/check-graph";
import type { CoveringCheck } from "@/lib/calc/doubt";

/** A passed check of unit SUM-01 that nothing else is known of, unless said otherwise. */
export function standing(given: Partial<CoveringCheck> & { id: string }): CoveringCheck {
  const serial = given.serial ?? "SUM-01";
  return {
    unitId: serial,
    serial,
    board: serial.slice(0, 3),
    stage: "function",
    title: given.id,
    position: 1,
    holdPoint: false,
    lifted: false,
    needs: [],
    state: "passed",
    ...given,
    covers: { signals: [], pins: [], rails: [], blocks: [], ...given.covers },
  };
}

const names = (list: readonly string[]) => fc.uniqueArray(fc.constantFrom(...list), { maxLength: 2 });

const SIGNALS = ["PH6", "PH[7:0]", "CLK", "clk", "+5V"];
const PINS = ["J1 a4", "J1 a5", "a4", "U7 3"];
const BLOCKS = ["adder", "latch"];

export const covers = fc.record({
  signals: names(SIGNALS),
  pins: names(PINS),
  rails: names(["+5 V", "GND"]),
  blocks: names(BLOCKS),
});

const SERIALS = ["PSU-01", "SUM-01", "SUM-02"];

/** Travelers of three units; a check needs only checks made before it, so there is no circle. */
export const travelers: fc.Arbitrary<CoveringCheck[]> = fc
  .array(
    fc.record({
      serial: fc.constantFrom(...SERIALS),
      stage: fc.constantFrom(...CHECK_STAGES),
      holdPoint: fc.boolean(),
      lifted: fc.boolean(),
      needs: fc.uniqueArray(fc.nat(30), { maxLength: 3 }),
      state: fc.constantFrom<StandingCheck["state"]>("passed", "passed", "untested", "failed", "conceded", "doubtful"),
      covers,
    }),
    { maxLength: 20 },
  )
  .map((drawn) =>
    drawn.map((one, at) =>
      standing({
        ...one,
        id: `c${at}`,
        position: at,
        needs: one.needs.filter((need) => need < at).map((need) => `c${need}`),
      }),
    ),
  );
