import { describePart, gate } from "../describe-part";
import { type GatePins, type LogicPart } from "../part";

const fourAndFour = (restHigh: number[][]): GatePins[] => [
  gate([2, 4, 6, 8, 1], [18, 16, 14, 12], restHigh[0]),
  gate([11, 13, 15, 17, 19], [9, 7, 5, 3], restHigh[1]),
];
const ACROSS = [18, 17, 16, 15, 14, 13, 12, 11];

/** Bus drivers and transceivers with three-state outputs. Bits that share an enable count as one buffer. */
export const BUFFER_PARTS: LogicPart[] = [
  describePart({
    number: "125",
    name: "Quad buffer, three-state, active-low enables",
    gateFunction: "buffer-three-state",
    output: "three-state",
    pins: 14,
    pinout: [gate([2, 1], [3], [1]), gate([5, 4], [6], [4]), gate([9, 10], [8], [10]), gate([12, 13], [11], [13])],
  }),
  describePart({
    number: "126",
    name: "Quad buffer, three-state, active-high enables",
    gateFunction: "buffer-three-state-high",
    output: "three-state",
    pins: 14,
    pinout: [gate([2, 1], [3]), gate([5, 4], [6]), gate([9, 10], [8]), gate([12, 13], [11])],
  }),
  describePart({
    number: "240",
    name: "Two 4-bit inverting buffers, three-state",
    gateFunction: "buffer4-inverting",
    bitsPerGate: 4,
    output: "three-state",
    pins: 20,
    pinout: fourAndFour([[1], [19]]),
  }),
  describePart({
    number: "241",
    name: "Two 4-bit buffers, three-state, one enable of each sense",
    gateFunction: "buffer4-either-enable",
    bitsPerGate: 4,
    output: "three-state",
    pins: 20,
    pinout: fourAndFour([[1], []]),
  }),
  describePart({
    number: "244",
    name: "Two 4-bit buffers, three-state",
    gateFunction: "buffer4",
    bitsPerGate: 4,
    output: "three-state",
    pins: 20,
    pinout: fourAndFour([[1], [19]]),
  }),
  describePart({
    number: "245",
    name: "8-bit transceiver, three-state",
    gateFunction: "transceiver8",
    bitsPerGate: 8,
    output: "three-state",
    pins: 20,
    pinout: [gate([2, 3, 4, 5, 6, 7, 8, 9, 1, 19], ACROSS, [19])],
  }),
  describePart({
    number: "541",
    name: "8-bit buffer, three-state",
    gateFunction: "buffer8",
    bitsPerGate: 8,
    output: "three-state",
    pins: 20,
    pinout: [gate([2, 3, 4, 5, 6, 7, 8, 9, 1, 19], ACROSS, [1, 19])],
  }),
];
