import fc from "fast-check";
import { PIN_ROLES, type Machine } from "@/lib/calc/interconnect";
import { FAMILIES } from "@/lib/calc/levels";
import { face } from "./face";

const word = fc.oneof(
  fc.constantFrom("", "a1", "A1", "b2", "31", "J1", "+5V", "GND", "\u0000", "é"),
  fc.string({ maxLength: 4 }),
);
const number = fc.oneof(fc.constantFrom(Number.NaN, Infinity, -1, 0, 0.5), fc.double());

/** Machines in which names collide, references lead nowhere and figures are no numbers. */
export const anyGarbage: fc.Arbitrary<Machine> = fc.record({
  boards: fc.array(
    fc.record({
      code: word,
      name: word,
      kind: fc.constantFrom("card", "backplane"),
      connectors: fc.array(
        fc.record({
          id: word,
          reference: word,
          face: fc.constantFrom("din41612-c64", "header-2x5", "edge-2x22").map(face),
          pins: fc.array(
            fc.record({
              pin: word,
              signal: word,
              role: fc.constantFrom(...PIN_ROLES),
              family: fc.constantFrom("", "HC", "LS", "no family"),
              loads: number,
              enableGroup: word,
              pullUpOhm: fc.option(number),
            }),
            { maxLength: 6 },
          ),
        }),
        { maxLength: 3 },
      ),
      untiedSpares: fc.array(fc.record({ part: word, gates: number, inputs: number, family: word }), { maxLength: 2 }),
    }),
    { maxLength: 4 },
  ),
  placements: fc.array(
    fc.record({ id: word, board: word, label: word, slot: fc.option(fc.integer({ min: -1, max: 3 })) }),
    { maxLength: 5 },
  ),
  matings: fc.array(
    fc.record({
      from: fc.record({ placement: word, connector: word }),
      to: fc.record({ placement: word, connector: word }),
    }),
    { maxLength: 5 },
  ),
  signals: fc.array(
    fc.record({
      name: word,
      class: fc.constantFrom("data", "clock", "ground", "power"),
      aliases: fc.array(word, { maxLength: 2 }),
      frequencyHz: fc.option(number),
    }),
    { maxLength: 3 },
  ),
  rails: fc.array(fc.record({ name: word, volts: number, tolerancePercent: number }), { maxLength: 2 }),
  draws: fc.array(fc.record({ placement: word, rail: word, typicalA: number, worstA: number }), { maxLength: 2 }),
  families: fc.constantFrom([], FAMILIES),
  conditions: fc.record({ ambientC: number, logicVolts: number, logicRail: word, pinCapacitancePf: number }),
});
