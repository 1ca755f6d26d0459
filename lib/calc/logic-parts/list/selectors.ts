import { describePart, gate } from "../describe-part";
import { type LogicPart } from "../part";

const QUAD_MUX = [gate([2, 3], [4]), gate([5, 6], [7]), gate([11, 10], [9]), gate([14, 13], [12])];

/** Decoders, multiplexers, adders and comparators. */
export const SELECTOR_PARTS: LogicPart[] = [
  describePart({
    number: "85",
    name: "4-bit magnitude comparator",
    gateFunction: "comparator4",
    bitsPerGate: 4,
    pins: 16,
    pinout: [gate([10, 12, 13, 15, 9, 11, 14, 1, 2, 3, 4], [5, 6, 7])],
  }),
  describePart({
    number: "138",
    name: "3-to-8 decoder, active-low outputs",
    gateFunction: "decoder3to8",
    pins: 16,
    pinout: [gate([1, 2, 3, 4, 5, 6], [15, 14, 13, 12, 11, 10, 9, 7], [4, 5])],
  }),
  describePart({
    number: "139",
    name: "Dual 2-to-4 decoder, active-low outputs",
    gateFunction: "decoder2to4",
    pins: 16,
    pinout: [gate([1, 2, 3], [4, 5, 6, 7], [1]), gate([15, 14, 13], [12, 11, 10, 9], [15])],
  }),
  describePart({
    number: "151",
    name: "8-input multiplexer",
    gateFunction: "mux8",
    pins: 16,
    pinout: [gate([4, 3, 2, 1, 15, 14, 13, 12, 11, 10, 9, 7], [5, 6], [7])],
  }),
  describePart({
    number: "153",
    name: "Dual 4-input multiplexer, common selects",
    gateFunction: "mux4",
    pins: 16,
    pinout: [gate([6, 5, 4, 3, 1], [7], [1]), gate([10, 11, 12, 13, 15], [9], [15])],
    sharedInputs: [14, 2],
  }),
  describePart({
    number: "157",
    name: "Quad 2-input multiplexer, common select",
    gateFunction: "mux2",
    pins: 16,
    pinout: QUAD_MUX,
    sharedInputs: [1, 15],
  }),
  describePart({
    number: "158",
    name: "Quad 2-input multiplexer, common select, inverting",
    gateFunction: "mux2-inverting",
    pins: 16,
    pinout: QUAD_MUX,
    sharedInputs: [1, 15],
  }),
  describePart({
    number: "181",
    name: "4-bit arithmetic unit",
    gateFunction: "alu4",
    bitsPerGate: 4,
    pins: 24,
    pinout: [gate([2, 23, 21, 19, 1, 22, 20, 18, 6, 5, 4, 3, 7, 8], [9, 10, 11, 13, 14, 15, 16, 17])],
  }),
  describePart({
    number: "257",
    name: "Quad 2-input multiplexer, common select, three-state",
    gateFunction: "mux2-three-state",
    output: "three-state",
    pins: 16,
    pinout: QUAD_MUX,
    sharedInputs: [1, 15],
  }),
  describePart({
    number: "283",
    name: "4-bit full adder with fast carry",
    gateFunction: "adder4",
    bitsPerGate: 4,
    pins: 16,
    pinout: [gate([5, 3, 14, 12, 6, 2, 15, 11, 7], [4, 1, 13, 10, 9])],
  }),
  describePart({
    number: "688",
    name: "8-bit equality comparator",
    gateFunction: "equal8",
    bitsPerGate: 8,
    pins: 20,
    pinout: [gate([2, 4, 6, 8, 11, 13, 15, 17, 3, 5, 7, 9, 12, 14, 16, 18, 1], [19], [1])],
  }),
];
