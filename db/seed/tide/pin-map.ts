import type { PinRole } from "@/lib/calc/interconnect";

/** One line of a board's pin map as it would be typed. */
export type MapLine = {
  pin: string;
  signal: string;
  role: PinRole;
  family?: string;
  loads?: number;
  enableGroup?: string;
  pullUp?: string;
};

type Drive = Omit<MapLine, "pin" | "signal">;

/** NAME7 … NAME0 on neighbouring pins: the highest bit on the first. */
function bus(name: string, high: number, pins: readonly string[], drive: Drive): MapLine[] {
  return pins.map((pin, index) => ({ pin, signal: `${name}${high - index}`, ...drive }));
}

const run = (row: string, from: number, to: number) =>
  Array.from({ length: to - from + 1 }, (_, index) => `${row}${from + index}`);

const power = (signal: string, ...pins: string[]) => pins.map((pin): MapLine => ({ pin, signal, role: "power" }));
const ground = (...pins: string[]) => pins.map((pin): MapLine => ({ pin, signal: "GND", role: "ground" }));

/** Every card: grounds at the corners and around the clocks, the logic supply beside them. */
const COMMON = [...ground("a1", "b1", "a12", "a13", "b11", "a32", "b32"), ...power("+5V", "a2", "b2")];
const ANALOGUE_SUPPLY = [...power("+12V", "a3", "b3"), ...power("-12V", "a4", "b4")];

const IN: Drive = { role: "input", family: "HC", loads: 1 };
const OUT: Drive = { role: "push-pull output", family: "HC" };
const THROUGH: Drive = { role: "passive" };
const OPEN: Drive = { role: "open-drain output", family: "HCT" };

/** Where the buses run: a slot uses a14 … a25 either for phase bits or for the sine, b24 … a31 for phase or sum. */
const LOW_PHASE = run("a", 14, 21);
const HIGH_PHASE = [...run("b", 24, 31), "a26", "a27"];
const SINE = run("a", 14, 25);
const SUM = [...run("b", 24, 31), ...run("a", 26, 31), "b15", "b13"];
const INCREMENT = run("b", 16, 23);

/** What the front panel sees of the rack, through the ribbon from slot 8. */
const RIBBON: MapLine[] = [
  ...COMMON,
  ...bus("PH", 7, LOW_PHASE, THROUGH),
  ...bus("INC", 7, INCREMENT, THROUGH),
  { pin: "b6", signal: "STEP", ...THROUGH },
  { pin: "a9", signal: "IMON", ...THROUGH },
  { pin: "a8", signal: "BUSY_N", ...THROUGH },
  { pin: "b8", signal: "FAULT_N", ...THROUGH },
];

/** Pin maps by board code, then by reference of the connector. Three mistakes are left in on purpose. */
export const CARD_MAPS: Record<string, Record<string, MapLine[]>> = {
  SUP: {
    J1: [
      ...COMMON,
      ...ANALOGUE_SUPPLY,
      { pin: "a9", signal: "IMON", ...THROUGH },
      { pin: "b9", signal: "PWR_OK", ...OUT },
      { pin: "b8", signal: "FAULT_N", ...OPEN },
    ],
  },
  TIM: {
    J1: [
      ...COMMON,
      { pin: "a10", signal: "PHI1", role: "push-pull output", family: "AC" },
      { pin: "a11", signal: "PHI2", role: "push-pull output", family: "AC" },
      { pin: "b10", signal: "CLK", role: "push-pull output", family: "AC" },
      { pin: "b12", signal: "RESET_N", ...OUT },
      { pin: "a5", signal: "SELM2_N", ...OUT },
      { pin: "b5", signal: "SELS2_N", ...OUT },
      { pin: "a6", signal: "SELN2_N", ...OUT },
      { pin: "a7", signal: "STB", ...OUT },
      { pin: "b6", signal: "STEP", ...IN },
      { pin: "b9", signal: "PWROK", ...IN },
      { pin: "a8", signal: "BUSY_N", ...IN, pullUp: "2k2" },
      { pin: "b14", signal: "CARRY_N", ...IN },
    ],
  },
  CON: {
    J1: [
      ...COMMON,
      { pin: "a5", signal: "SEL_N", ...IN },
      { pin: "a10", signal: "PHI1", ...IN, loads: 2 },
      { pin: "a11", signal: "PHI2", ...IN, loads: 2 },
      { pin: "b10", signal: "CLK", ...IN, loads: 3 },
      { pin: "b12", signal: "RESET_N", ...IN, loads: 4 },
      ...bus("PH", 7, LOW_PHASE, { role: "three-state output", family: "HC", enableGroup: "SEL" }),
      ...bus("PH", 23, HIGH_PHASE, { role: "three-state output", family: "HC", enableGroup: "SEL" }),
      ...bus("INC", 7, INCREMENT, { ...IN, loads: 2 }),
      { pin: "a8", signal: "BUSY_N", ...OPEN },
      { pin: "b14", signal: "CARRY_N", ...OUT },
    ],
  },
  SIN: {
    J1: [
      ...COMMON,
      { pin: "a10", signal: "PHI1", ...IN },
      ...bus("PH", 23, HIGH_PHASE, { ...IN, family: "HCT", loads: 2 }),
      ...bus("SINE", 11, SINE, { role: "three-state output", family: "HCT", enableGroup: "SINE" }),
    ],
  },
  SUM: {
    J1: [
      ...COMMON,
      { pin: "b10", signal: "CLK", ...IN },
      { pin: "b12", signal: "RESET_N", ...IN, loads: 2 },
      { pin: "a7", signal: "STB", ...IN, loads: 2 },
      { pin: "b7", signal: "SAT", ...OUT },
      { pin: "a8", signal: "BUSY_N", ...OPEN },
      { pin: "b8", signal: "FAULT_N", ...OPEN },
      ...bus("SINE", 11, SINE, { ...IN, loads: 2 }),
      ...bus("SUM", 15, SUM, OUT),
    ],
  },
  OUT: {
    J1: [
      ...RIBBON.filter(({ signal }) => signal !== "BUSY_N" && signal !== "FAULT_N"),
      ...ANALOGUE_SUPPLY,
      { pin: "b12", signal: "RESET_N", ...IN },
      { pin: "a7", signal: "STB", ...IN, loads: 2 },
      { pin: "b7", signal: "SAT", ...IN },
      { pin: "a8", signal: "BUSY_N", ...OPEN },
      { pin: "b8", signal: "FAULT_N", ...OPEN },
      ...bus("SUM", 15, SUM, IN),
    ],
    J3: RIBBON,
  },
  PAN: {
    J1: [
      ...COMMON,
      ...bus("PH", 7, LOW_PHASE, IN),
      ...bus("INC", 7, INCREMENT, OUT),
      { pin: "b6", signal: "STEP", role: "push-pull output", family: "LS" },
      { pin: "a9", signal: "IMON", ...THROUGH },
      { pin: "a8", signal: "BUSY_N", ...IN, family: "HCT" },
      { pin: "b8", signal: "FAULT_N", ...IN, family: "HCT" },
    ],
  },
};

const SELECTS: Record<number, string> = { 3: "SELM2_N", 4: "SELS2_N", 7: "SELN2_N" };
const PHASE_SLOTS = [3, 4, 5, 7];
const LAMP_SLOTS = [3, 4, 7, 8];

/** The backplane behind a slot: the bus that runs through all of them, and what only some slots share. */
export function slotMap(slot: number): MapLine[] {
  const hasSine = slot === 5 || slot === 6;
  const hasSum = slot === 6 || slot === 8;
  const select = SELECTS[slot];
  return [
    ...COMMON,
    ...ANALOGUE_SUPPLY,
    ...(select
      ? [{ pin: "a5", signal: select, ...THROUGH }]
      : ["SELM2_N", "SELS2_N", "SELN2_N"].map((signal, at) => ({
          pin: ["a5", "b5", "a6"][at] ?? "",
          signal,
          ...THROUGH,
        }))),
    ...[
      ["b6", "STEP"],
      ["a7", "STB"],
      ["b7", "SAT"],
      ["a8", "BUSY_N"],
      ["b8", "FAULT_N"],
      ["a9", "IMON"],
      ["b9", "PWR_OK"],
      ["a10", "PHI1"],
      ["b10", "CLK"],
      ["a11", "PHI2"],
      ["b12", "RESET_N"],
      ["b14", "CARRY_N"],
    ].map(([pin = "", signal = ""]): MapLine => ({ pin, signal, ...THROUGH })),
    ...bus("INC", 7, INCREMENT, THROUGH),
    ...(hasSine ? bus("SINE", 11, SINE, THROUGH) : LAMP_SLOTS.includes(slot) ? bus("PH", 7, LOW_PHASE, THROUGH) : []),
    ...(hasSum ? bus("SUM", 15, SUM, THROUGH) : PHASE_SLOTS.includes(slot) ? bus("PH", 23, HIGH_PHASE, THROUGH) : []),
  ];
}

export const SIGNALS: {
  name: string;
  class: "clock" | "control" | "power" | "ground" | "analogue";
  aliases?: string[];
  frequency?: string;
  note?: string;
}[] = [
  { name: "GND", class: "ground" },
  { name: "+5V", class: "power" },
  { name: "+12V", class: "power" },
  { name: "-12V", class: "power" },
  { name: "PHI1", class: "clock", frequency: "3.6864 MHz", note: "Two phases that never overlap." },
  { name: "PHI2", class: "clock", frequency: "3.6864 MHz" },
  { name: "CLK", class: "clock", frequency: "1.8432 MHz" },
  { name: "RESET_N", class: "control" },
  { name: "STB", class: "control" },
  {
    name: "SELM2_N",
    class: "control",
    aliases: ["SEL_N"],
    note: "Each constituent listens on a5 to the line of its slot.",
  },
  { name: "SELS2_N", class: "control", aliases: ["SEL_N"] },
  { name: "SELN2_N", class: "control", aliases: ["SEL_N"] },
  { name: "IMON", class: "analogue", note: "1 V an ampere, from the shunt on the supply entry." },
];
