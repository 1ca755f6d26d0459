import fc from "fast-check";
import { PIN_ROLES, SIGNAL_CLASSES, type Machine, type Rail } from "@/lib/calc/interconnect";
import { rack, type PinMap, type Rack } from "./small-machine";

const SIGNALS = ["", "D0", "D1", "D2", "d1", "CLK", "PHI1", "SEL_N", "BUSY_N", "+5V", "+12V", "VCC", "GND", "AGND"];
const PINS = ["a1", "a2", "a3", "a4", "c1", "c2", "c3", "a31", "a32", "c32"];

const what = fc.record({
  signal: fc.constantFrom(...SIGNALS),
  role: fc.constantFrom(...PIN_ROLES),
  family: fc.constantFrom("", "HC", "LS", "HCT", "AC", "F", "LVC 3.3 V", "XY"),
  loads: fc.integer({ min: 0, max: 12 }),
  enableGroup: fc.constantFrom("", "SEL", "SINE"),
  pullUpOhm: fc.constantFrom(null, null, null, 470, 2200, 10_000, 2e6),
});
const pinMap: fc.Arbitrary<PinMap> = fc.dictionary(fc.constantFrom(...PINS), what, { maxKeys: PINS.length });
const code = fc.constantFrom("CON", "SIN", "SUM");

const repeated = fc.array(code, { minLength: 1, maxLength: 5 });
const once = fc.shuffledSubarray(["CON", "SIN", "SUM"], { minLength: 1 });

/** Racks of a few cards with everything right and wrong with them that a pin map can say, each pin listed once. */
const machineOf = (sitting: fc.Arbitrary<string[]>, mostOddities: number, mayBeApart: fc.Arbitrary<boolean>) =>
  fc
    .record({
      cards: fc.record({ CON: pinMap, SIN: pinMap, SUM: pinMap }),
      slots: sitting,
      /** What a slot says on a pin instead of what the cards say; mostly nothing. */
      oddities: fc.array(
        fc.record({
          slot: fc.integer({ min: 1, max: 5 }),
          pin: fc.constantFrom(...PINS),
          signal: fc.option(fc.constantFrom(...SIGNALS), { nil: undefined }),
        }),
        { maxLength: mostOddities },
      ),
      signals: fc.uniqueArray(
        fc.record({
          name: fc.constantFrom(...SIGNALS.slice(1)),
          class: fc.constantFrom(...SIGNAL_CLASSES),
          aliases: fc.array(fc.constantFrom(...SIGNALS.slice(1)), { maxLength: 2 }),
          frequencyHz: fc.constantFrom(null, 1e3, 20e6),
        }),
        { selector: ({ name }) => name, maxLength: 5 },
      ),
      rails: fc.constantFrom<Rail[]>([], [{ name: "+5V", volts: 5, tolerancePercent: 5 }]),
      draws: fc.array(
        fc.record({
          placement: fc.constantFrom("slot 1", "slot 2", "slot 3"),
          rail: fc.constantFrom("+5V", "+12V"),
          typicalA: fc.constant(0.1),
          worstA: fc.constantFrom(0.2, 1.7, 3.1, -4),
        }),
        { maxLength: 3 },
      ),
      spares: fc.boolean(),
      isApart: mayBeApart,
    })
    .map(({ cards, slots, oddities, signals, rails, draws, spares, isApart }) => {
      const straight = rack({ cards, slots });
      const onBus = new Map(straight.boards.at(-1)?.connectors[0]?.pins.map((pin) => [pin.pin, pin.signal] as const));
      const backplane: Rack["backplane"] = (slot, pin) => {
        const odd = oddities.find((one) => one.slot === slot && one.pin === pin);
        return odd ? odd.signal : onBus.get(pin);
      };
      const machine = rack({ cards, slots, backplane, more: { signals, rails, draws } });
      const boards = machine.boards.map((board) => ({
        ...board,
        untiedSpares: spares && board.code === "CON" ? [{ part: "74HC00", gates: 1, inputs: 2, family: "HC" }] : [],
      }));
      return { ...machine, boards, matings: isApart ? machine.matings.slice(1) : machine.matings };
    });

/** Designs in several slots, slots that differ, a card that stands beside the rack. */
export const anyMachine: fc.Arbitrary<Machine> = machineOf(repeated, 4, fc.boolean());

/**
 * Where each pin of a design is on one net: every design once, or a bus that is the same in every slot. Elsewhere an edit
 * may mend one slot and bring the same mistake to another, which is then found under the same words.
 */
export const anyPlainMachine: fc.Arbitrary<Machine> = fc.oneof(
  machineOf(once, 4, fc.boolean()),
  machineOf(repeated, 0, fc.constant(false)),
);

/** The same machine with every list in another order. */
export const shuffled = (machine: Machine): fc.Arbitrary<Machine> => {
  const mixed = <T>(list: readonly T[]) => fc.shuffledSubarray([...list], { minLength: list.length });
  return fc
    .record({
      boards: mixed(machine.boards),
      placements: mixed(machine.placements),
      matings: mixed(machine.matings),
      signals: mixed(machine.signals),
      rails: mixed(machine.rails),
      draws: mixed(machine.draws),
      turn: fc.boolean(),
      seed: fc.integer(),
    })
    .chain(({ turn, boards, matings, ...rest }) =>
      fc
        .tuple(
          ...boards.map((board) =>
            fc
              .tuple(mixed(board.connectors), ...board.connectors.map(({ pins }) => mixed(pins)))
              .map(([order, ...lists]) => {
                const pinsOf = new Map(board.connectors.map(({ id }, at) => [id, lists[at] ?? []]));
                return {
                  ...board,
                  connectors: order.map((one) => ({ ...one, pins: pinsOf.get(one.id) ?? [] })),
                };
              }),
          ),
        )
        .map((mixedBoards) => ({
          ...machine,
          ...rest,
          boards: mixedBoards,
          matings: turn ? matings.map(({ from, to }) => ({ from: to, to: from })) : matings,
        })),
    );
};
