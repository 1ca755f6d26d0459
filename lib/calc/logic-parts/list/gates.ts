import { describePart, gate } from "../describe-part";
import { type LogicPart } from "../part";

const QUAD = [gate([1, 2], [3]), gate([4, 5], [6]), gate([9, 10], [8]), gate([12, 13], [11])];
const QUAD_OUTPUT_FIRST = [gate([2, 3], [1]), gate([5, 6], [4]), gate([8, 9], [10]), gate([11, 12], [13])];
const TRIPLE = [gate([1, 2, 13], [12]), gate([3, 4, 5], [6]), gate([9, 10, 11], [8])];
const DUAL_FOUR = [gate([1, 2, 4, 5], [6]), gate([9, 10, 12, 13], [8])];
const HEX = [gate([1], [2]), gate([3], [4]), gate([5], [6]), gate([9], [8]), gate([11], [10]), gate([13], [12])];

/** Gates and inverters in 14 pins. */
export const GATE_PARTS: LogicPart[] = [
  describePart({ number: "00", name: "Quad 2-input NAND", gateFunction: "nand2", pins: 14, pinout: QUAD }),
  describePart({ number: "02", name: "Quad 2-input NOR", gateFunction: "nor2", pins: 14, pinout: QUAD_OUTPUT_FIRST }),
  describePart({
    number: "03",
    name: "Quad 2-input NAND, open drain",
    gateFunction: "nand2-open-drain",
    output: "open-drain",
    pins: 14,
    pinout: QUAD,
  }),
  describePart({ number: "04", name: "Hex inverter", gateFunction: "inv", pins: 14, pinout: HEX }),
  describePart({
    number: "05",
    name: "Hex inverter, open drain",
    gateFunction: "inv-open-drain",
    output: "open-drain",
    pins: 14,
    pinout: HEX,
  }),
  describePart({
    number: "06",
    name: "Hex inverter, open drain, high voltage in bipolar families",
    gateFunction: "inv-open-drain",
    output: "open-drain",
    pins: 14,
    pinout: HEX,
  }),
  describePart({
    number: "07",
    name: "Hex buffer, open drain",
    gateFunction: "buffer-open-drain",
    output: "open-drain",
    pins: 14,
    pinout: HEX,
  }),
  describePart({ number: "08", name: "Quad 2-input AND", gateFunction: "and2", pins: 14, pinout: QUAD }),
  describePart({ number: "10", name: "Triple 3-input NAND", gateFunction: "nand3", pins: 14, pinout: TRIPLE }),
  describePart({ number: "11", name: "Triple 3-input AND", gateFunction: "and3", pins: 14, pinout: TRIPLE }),
  describePart({
    number: "14",
    name: "Hex inverter, Schmitt inputs",
    gateFunction: "schmitt-inv",
    pins: 14,
    pinout: HEX,
  }),
  describePart({
    number: "20",
    name: "Dual 4-input NAND",
    gateFunction: "nand4",
    pins: 14,
    pinout: DUAL_FOUR,
    unconnectedPins: [3, 11],
  }),
  describePart({
    number: "21",
    name: "Dual 4-input AND",
    gateFunction: "and4",
    pins: 14,
    pinout: DUAL_FOUR,
    unconnectedPins: [3, 11],
  }),
  describePart({ number: "27", name: "Triple 3-input NOR", gateFunction: "nor3", pins: 14, pinout: TRIPLE }),
  describePart({
    number: "30",
    name: "8-input NAND",
    gateFunction: "nand8",
    pins: 14,
    pinout: [gate([1, 2, 3, 4, 5, 6, 11, 12], [8])],
    unconnectedPins: [9, 10, 13],
  }),
  describePart({ number: "32", name: "Quad 2-input OR", gateFunction: "or2", pins: 14, pinout: QUAD }),
  describePart({ number: "86", name: "Quad 2-input exclusive OR", gateFunction: "xor2", pins: 14, pinout: QUAD }),
  describePart({
    number: "132",
    name: "Quad 2-input NAND, Schmitt inputs",
    gateFunction: "schmitt-nand2",
    pins: 14,
    pinout: QUAD,
  }),
];
