import { describePart, gate } from "../describe-part";
import { type LogicPart } from "../part";

const SYNCHRONOUS_COUNTER = [gate([3, 4, 5, 6, 1, 2, 7, 9, 10], [14, 13, 12, 11, 15], [1, 9])];

/** Counters and shift registers. */
export const COUNTER_PARTS: LogicPart[] = [
  describePart({
    number: "161",
    name: "4-bit counter, asynchronous reset",
    gateFunction: "counter4",
    bitsPerGate: 4,
    pins: 16,
    pinout: SYNCHRONOUS_COUNTER,
  }),
  describePart({
    number: "163",
    name: "4-bit counter, synchronous reset",
    gateFunction: "counter4-synchronous-reset",
    bitsPerGate: 4,
    pins: 16,
    pinout: SYNCHRONOUS_COUNTER,
  }),
  describePart({
    number: "164",
    name: "8-bit shift register, parallel out",
    gateFunction: "shift8-out",
    bitsPerGate: 8,
    pins: 14,
    pinout: [gate([1, 2, 8, 9], [3, 4, 5, 6, 10, 11, 12, 13], [9])],
  }),
  describePart({
    number: "165",
    name: "8-bit shift register, parallel load",
    gateFunction: "shift8-load",
    bitsPerGate: 8,
    pins: 16,
    pinout: [gate([11, 12, 13, 14, 3, 4, 5, 6, 10, 1, 2, 15], [9, 7], [1])],
  }),
  describePart({
    number: "191",
    name: "4-bit up/down counter with direction",
    gateFunction: "counter4-direction",
    bitsPerGate: 4,
    pins: 16,
    pinout: [gate([15, 1, 10, 9, 4, 5, 11, 14], [3, 2, 6, 7, 12, 13], [4, 11])],
  }),
  describePart({
    number: "193",
    name: "4-bit up/down counter with two clocks",
    gateFunction: "counter4-two-clocks",
    bitsPerGate: 4,
    pins: 16,
    pinout: [gate([15, 1, 10, 9, 4, 5, 11, 14], [3, 2, 6, 7, 12, 13], [4, 5, 11])],
  }),
  describePart({
    number: "299",
    name: "8-bit universal shift register, three-state",
    gateFunction: "shift8-universal",
    bitsPerGate: 8,
    output: "three-state",
    pins: 20,
    pinout: [gate([1, 2, 3, 9, 11, 12, 18, 19], [7, 13, 6, 14, 5, 15, 4, 16, 8, 17], [2, 3, 9])],
  }),
  describePart({
    number: "393",
    name: "Dual 4-bit ripple counter",
    gateFunction: "ripple-counter4",
    bitsPerGate: 4,
    pins: 14,
    pinout: [gate([1, 2], [3, 4, 5, 6]), gate([13, 12], [11, 10, 9, 8])],
  }),
  describePart({
    number: "595",
    name: "8-bit shift register with output register, three-state",
    gateFunction: "shift8-register",
    bitsPerGate: 8,
    output: "three-state",
    pins: 16,
    pinout: [gate([14, 11, 12, 10, 13], [15, 1, 2, 3, 4, 5, 6, 7, 9], [10, 13])],
  }),
];
