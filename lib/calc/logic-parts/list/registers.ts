import { describePart, gate } from "../describe-part";
import { type GatePins, type LogicPart } from "../part";

/** Eight bits, inputs and outputs beside each other: 273, 373, 374, 377. */
const besideEachOther = (controls: number[], restHigh: number[]): GatePins[] => [
  gate([3, 4, 7, 8, 13, 14, 17, 18, ...controls], [2, 5, 6, 9, 12, 15, 16, 19], restHigh),
];
/** Eight bits straight across the package: 573, 574. */
const straightAcross: GatePins[] = [gate([2, 3, 4, 5, 6, 7, 8, 9, 1, 11], [19, 18, 17, 16, 15, 14, 13, 12], [1])];

/** Flip-flops, registers and latches. Bits that share a clock count as one register. */
export const REGISTER_PARTS: LogicPart[] = [
  describePart({
    number: "74",
    name: "Dual D flip-flop with set and reset",
    gateFunction: "dff",
    pins: 14,
    pinout: [gate([2, 3, 4, 1], [5, 6], [1, 4]), gate([12, 11, 10, 13], [9, 8], [10, 13])],
  }),
  describePart({
    number: "173",
    name: "4-bit register, three-state, with enables",
    gateFunction: "reg4-three-state",
    bitsPerGate: 4,
    output: "three-state",
    pins: 16,
    pinout: [gate([14, 13, 12, 11, 1, 2, 7, 9, 10, 15], [3, 4, 5, 6], [1, 2, 9, 10])],
  }),
  describePart({
    number: "174",
    name: "6-bit register with reset",
    gateFunction: "reg6",
    bitsPerGate: 6,
    pins: 16,
    pinout: [gate([3, 4, 6, 11, 13, 14, 1, 9], [2, 5, 7, 10, 12, 15], [1])],
  }),
  describePart({
    number: "175",
    name: "4-bit register with reset, both outputs",
    gateFunction: "reg4",
    bitsPerGate: 4,
    pins: 16,
    pinout: [gate([4, 5, 12, 13, 1, 9], [2, 7, 10, 15, 3, 6, 11, 14], [1])],
  }),
  describePart({
    number: "273",
    name: "8-bit register with reset",
    gateFunction: "reg8",
    bitsPerGate: 8,
    pins: 20,
    pinout: besideEachOther([1, 11], [1]),
  }),
  describePart({
    number: "373",
    name: "8-bit latch, three-state",
    gateFunction: "latch8-three-state",
    bitsPerGate: 8,
    output: "three-state",
    pins: 20,
    pinout: besideEachOther([1, 11], [1]),
  }),
  describePart({
    number: "374",
    name: "8-bit register, three-state",
    gateFunction: "reg8-three-state",
    bitsPerGate: 8,
    output: "three-state",
    pins: 20,
    pinout: besideEachOther([1, 11], [1]),
  }),
  describePart({
    number: "377",
    name: "8-bit register with clock enable",
    gateFunction: "reg8-enable",
    bitsPerGate: 8,
    pins: 20,
    pinout: besideEachOther([1, 11], [1]),
  }),
  describePart({
    number: "573",
    name: "8-bit latch, three-state, pins straight across",
    gateFunction: "latch8-three-state",
    bitsPerGate: 8,
    output: "three-state",
    pins: 20,
    pinout: straightAcross,
  }),
  describePart({
    number: "574",
    name: "8-bit register, three-state, pins straight across",
    gateFunction: "reg8-three-state",
    bitsPerGate: 8,
    output: "three-state",
    pins: 20,
    pinout: straightAcross,
  }),
];
