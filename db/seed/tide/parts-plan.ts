export type DemoBlock = {
  name: string;
  summary: string;
  gates: { gateFunction: string; count: number }[];
  children?: { block: string; count: number }[];
};

/** Sub-circuits of the tide computer; children by name. */
export const BLOCKS: DemoBlock[] = [
  {
    name: "Full adder",
    summary: "One bit: sum and carry from two bits and a carry.",
    gates: [
      { gateFunction: "xor2", count: 2 },
      { gateFunction: "and2", count: 2 },
      { gateFunction: "or2", count: 1 },
    ],
  },
  {
    name: "Phase bit",
    summary: "A full adder whose sum is kept at the clock.",
    gates: [{ gateFunction: "dff", count: 1 }],
    children: [{ block: "Full adder", count: 1 }],
  },
  {
    name: "Phase accumulator",
    summary: "24 phase bits in a row; the carry ripples through.",
    gates: [],
    children: [{ block: "Phase bit", count: 24 }],
  },
  {
    name: "Bus driver",
    summary: "Eighteen phase bits onto the backplane when the card is selected.",
    gates: [{ gateFunction: "buffer8", count: 3 }],
  },
  {
    name: "Four-bit adder",
    summary: "Four full adders; twenty gates, five packages.",
    gates: [],
    children: [{ block: "Full adder", count: 4 }],
  },
  {
    name: "Saturating adder",
    summary: "Sixteen bits; at overflow the sum stays at its end.",
    gates: [
      { gateFunction: "mux2", count: 16 },
      { gateFunction: "xor2", count: 2 },
      { gateFunction: "inv", count: 1 },
    ],
    children: [{ block: "Four-bit adder", count: 4 }],
  },
  {
    name: "Sum register",
    summary: "Sixteen bits, taken at STB.",
    gates: [{ gateFunction: "reg8", count: 2 }],
  },
  {
    name: "Divider chain",
    summary: "From the crystal down to one step a second.",
    gates: [
      { gateFunction: "counter4", count: 5 },
      { gateFunction: "inv", count: 2 },
    ],
  },
  {
    name: "Two-phase clock",
    summary: "Two phases that are never high together.",
    gates: [
      { gateFunction: "nand2", count: 4 },
      { gateFunction: "inv", count: 6 },
      { gateFunction: "dff", count: 2 },
    ],
  },
  {
    name: "Reset stretcher",
    summary: "Holds RESET_N for 200 ms and lets it go with the clock.",
    gates: [
      { gateFunction: "inv", count: 2 },
      { gateFunction: "nand2", count: 2 },
      { gateFunction: "dff", count: 1 },
    ],
  },
  {
    name: "Slot select",
    summary: "One of three constituents is let onto the bus.",
    gates: [{ gateFunction: "decoder3to8", count: 1 }],
  },
  {
    name: "Quarter-wave mirror",
    summary: "Turns the address in the second and fourth quarter, the value in the third and fourth.",
    gates: [{ gateFunction: "xor2", count: 21 }],
  },
  {
    name: "Lamp driver",
    summary: "Eight lamps, each through its resistor.",
    gates: [{ gateFunction: "buffer8", count: 1 }],
  },
];

/** The last two bits go through half a quad buffer now: a package less. Two cards had been built by then. */
export const LATER_CHANGE: DemoBlock = {
  name: "Bus driver",
  summary: "Eighteen phase bits onto the backplane when the card is selected.",
  gates: [
    { gateFunction: "buffer8", count: 2 },
    { gateFunction: "buffer4", count: 1 },
  ],
};

export type BoardPlan = {
  board: string;
  packing: "pooled" | "per-block";
  family: string;
  clockHz: string;
  activity: number;
  loadPf: number;
  unitsPlanned: number | null;
  sparesTied: boolean;
  blocks: { block: string; count: number }[];
  lines: { partNumber: string; description: string; count: number; designators: string }[];
};

const FACE = { partNumber: "DIN 41612 B 64 male", description: "Edge connector, angled", count: 1, designators: "J1" };

export const PLANS: BoardPlan[] = [
  {
    board: "TIM",
    packing: "pooled",
    family: "HC",
    clockHz: "3.6864 MHz",
    activity: 0.5,
    loadPf: 120,
    unitsPlanned: 1,
    sparesTied: true,
    blocks: [
      { block: "Divider chain", count: 1 },
      { block: "Two-phase clock", count: 1 },
      { block: "Reset stretcher", count: 1 },
      { block: "Slot select", count: 1 },
    ],
    lines: [
      FACE,
      { partNumber: "XO 7.3728 MHz", description: "Crystal oscillator, half size", count: 1, designators: "Y1" },
      { partNumber: "33 Ω 0805", description: "Series termination of the clock lines", count: 3, designators: "R1–R3" },
    ],
  },
  {
    board: "CON",
    packing: "pooled",
    family: "HC",
    clockHz: "3.6864 MHz",
    activity: 0.5,
    loadPf: 80,
    unitsPlanned: 3,
    sparesTied: true,
    blocks: [
      { block: "Phase accumulator", count: 1 },
      { block: "Bus driver", count: 1 },
    ],
    lines: [FACE],
  },
  {
    board: "SIN",
    packing: "pooled",
    family: "HCT",
    clockHz: "1.8432 MHz",
    activity: 0.25,
    loadPf: 50,
    unitsPlanned: 1,
    sparesTied: false,
    blocks: [{ block: "Quarter-wave mirror", count: 1 }],
    lines: [
      FACE,
      {
        partNumber: "Memory 32K × 8, 70 ns",
        description: "Sine table, low and high byte",
        count: 2,
        designators: "U7, U8",
      },
    ],
  },
  {
    board: "SUM",
    packing: "per-block",
    family: "HC",
    clockHz: "1.8432 MHz",
    activity: 0.25,
    loadPf: 50,
    unitsPlanned: 1,
    sparesTied: true,
    blocks: [
      { block: "Saturating adder", count: 1 },
      { block: "Sum register", count: 1 },
    ],
    lines: [FACE],
  },
  {
    board: "OUT",
    packing: "pooled",
    family: "HC",
    clockHz: "1 kHz",
    activity: 0.5,
    loadPf: 50,
    unitsPlanned: 1,
    sparesTied: true,
    blocks: [{ block: "Sum register", count: 1 }],
    lines: [
      FACE,
      { partNumber: "DIN 41612 B 64 male", description: "Ribbon to the front panel", count: 1, designators: "J3" },
      { partNumber: "DAC 12 bit, parallel", description: "Pen position", count: 1, designators: "U5" },
      { partNumber: "Reference 2.500 V", description: "", count: 1, designators: "U6" },
    ],
  },
  {
    board: "PAN",
    packing: "pooled",
    family: "HC",
    clockHz: "10 Hz",
    activity: 1,
    loadPf: 100,
    unitsPlanned: 1,
    sparesTied: true,
    blocks: [{ block: "Lamp driver", count: 1 }],
    lines: [
      FACE,
      { partNumber: "LED 3 mm amber", description: "Phase lamps", count: 8, designators: "D1–D8" },
      { partNumber: "470 Ω 0805", description: "Lamp resistors", count: 8, designators: "R1–R8" },
      { partNumber: "Toggle switch", description: "Increment", count: 8, designators: "SW0–SW7" },
    ],
  },
  {
    board: "BPL",
    packing: "pooled",
    family: "HC",
    clockHz: "1 kHz",
    activity: 0,
    loadPf: 50,
    unitsPlanned: 1,
    sparesTied: true,
    blocks: [],
    lines: [
      { partNumber: "DIN 41612 B 64 female", description: "Slots 1 to 8", count: 8, designators: "X1–X8" },
      { partNumber: "150 Ω 0805", description: "Far-end termination", count: 3, designators: "R1–R3" },
    ],
  },
];

/** What lies in the drawers, and what one costs. */
export const STOCK: { number: string; stock: number; price: string }[] = [
  { number: "74HC86", stock: 20, price: "0.42" },
  { number: "74HC08", stock: 25, price: "0.36" },
  { number: "74HC32", stock: 12, price: "0.36" },
  { number: "74HC74", stock: 10, price: "0.39" },
  { number: "74HC157", stock: 4, price: "0.48" },
  { number: "74HC244", stock: 6, price: "0.62" },
  { number: "74HC273", stock: 3, price: "0.66" },
  { number: "74HC161", stock: 0, price: "1.10" },
  { number: "74HC04", stock: 5, price: "0.55" },
  { number: "DIN 41612 B 64 male", stock: 6, price: "3.40" },
  { number: "DIN 41612 B 64 female", stock: 8, price: "3.95" },
  { number: "LED 3 mm amber", stock: 50, price: "0.09" },
];

const hc = (name: string, part: string, count: number) => ({
  part,
  family: "HC",
  name,
  count: String(count),
  minS: "",
  typicalS: "",
  maxS: "",
});

/** Ripple carry: one exclusive OR, then an AND and an OR for each bit. */
export const DELAYS = [
  {
    name: "Carry through sixteen bits",
    board: "SUM",
    measure: "A0 rising to CARRY, all other bits of A at 1 and of B at 0",
    steps: [hc("half sum of bit 0", "86", 1), hc("carry, AND", "08", 16), hc("carry, OR", "32", 16)],
  },
  {
    name: "Phase bit 23 after the clock",
    board: "CON",
    measure: "CLK rising to PH23, increment 1 from FFFFFFh",
    steps: [
      hc("flip-flop of bit 0", "74", 1),
      hc("carry, AND", "08", 23),
      hc("carry, OR", "32", 23),
      hc("sum of bit 23", "86", 1),
      hc("onto the backplane", "541", 1),
    ],
  },
];
