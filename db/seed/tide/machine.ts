import type { BoardKind } from "@/db/schema/boards";
import type { ConnectorId } from "@/lib/calc/connector";
import type { CheckLine } from "./check-line";
import { CONSTITUENT, SINE, SUMMING } from "./cards-arithmetic";
import { BACKPLANE, OUTPUT, PANEL } from "./cards-output";
import { SUPPLY, TIMEBASE } from "./cards-power-time";

export type DemoBoard = {
  code: string;
  name: string;
  summary: string;
  kind: BoardKind;
  connectorType: ConnectorId | null;
  revisions: { letter: string; notes: string; daysAgo: number }[];
  lines: CheckLine[];
};

const FACE = "din41612-b64";

/** The tide computer: discrete logic that sums tidal constituents and moves a pen over paper. All of it is invented. */
export const PROJECT = {
  slug: "tide-computer",
  name: "Tide computer",
  summary: "Discrete logic that sums the tidal constituents of Sandrey harbour and draws the tide with a pen.",
  timeZone: "Europe/Amsterdam",
  startedDaysAgo: 98,
};

export const BOARDS: DemoBoard[] = [
  {
    code: "SUP",
    name: "Supply entry",
    summary: "5 V and ±12 V rails, current monitor",
    kind: "card",
    connectorType: FACE,
    revisions: [
      { letter: "A", notes: "First layout. The −12 V regulator's footprint is mirrored.", daysAgo: 97 },
      { letter: "B", notes: "Regulator turned, sense lead taken from the connector, TP7 added.", daysAgo: 80 },
    ],
    lines: SUPPLY,
  },
  {
    code: "TIM",
    name: "Timebase",
    summary: "3.6864 MHz, divider chain, phases",
    kind: "card",
    connectorType: FACE,
    revisions: [{ letter: "A", notes: "", daysAgo: 92 }],
    lines: TIMEBASE,
  },
  {
    code: "CON",
    name: "Constituent",
    summary: "Phase accumulator, 24 bit; one card a constituent",
    kind: "card",
    connectorType: FACE,
    revisions: [{ letter: "A", notes: "PH7 and CARRY_N run side by side under U6.", daysAgo: 70 }],
    lines: CONSTITUENT,
  },
  {
    code: "SIN",
    name: "Sine table",
    summary: "Two memories, quarter wave, 12 bit",
    kind: "card",
    connectorType: FACE,
    revisions: [{ letter: "A", notes: "", daysAgo: 66 }],
    lines: SINE,
  },
  {
    code: "SUM",
    name: "Summing card",
    summary: "16-bit adder, saturating",
    kind: "card",
    connectorType: FACE,
    revisions: [{ letter: "A", notes: "", daysAgo: 64 }],
    lines: SUMMING,
  },
  {
    code: "OUT",
    name: "Output and pen driver",
    summary: "12-bit DAC, servo loop",
    kind: "card",
    connectorType: FACE,
    revisions: [{ letter: "A", notes: "", daysAgo: 64 }],
    lines: OUTPUT,
  },
  {
    code: "PAN",
    name: "Front panel",
    summary: "Switches and lamps, by ribbon to the rack",
    kind: "card",
    connectorType: FACE,
    revisions: [{ letter: "A", notes: "", daysAgo: 63 }],
    lines: PANEL,
  },
  {
    code: "BPL",
    name: "Backplane",
    summary: "Eight slots of 64 pins, terminated clock lines",
    kind: "backplane",
    connectorType: FACE,
    revisions: [{ letter: "B", notes: "Slots at 5 HP, thicker 5 V bar.", daysAgo: 97 }],
    lines: BACKPLANE,
  },
];

export type DemoUnit = {
  serial: string;
  board: string;
  letter: string;
  note: string;
  daysAgo: number;
  archived?: true;
};

export const UNITS: DemoUnit[] = [
  { serial: "SUP-01", board: "SUP", letter: "A", note: "Kept for parts.", daysAgo: 91, archived: true },
  { serial: "SUP-02", board: "SUP", letter: "B", note: "", daysAgo: 78 },
  { serial: "TIM-01", board: "TIM", letter: "A", note: "", daysAgo: 72 },
  {
    serial: "CON-01",
    board: "CON",
    letter: "A",
    note: "Constituent M2.",
    daysAgo: 52,
  },
  { serial: "CON-02", board: "CON", letter: "A", note: "Constituent S2.", daysAgo: 41 },
  { serial: "SIN-01", board: "SIN", letter: "A", note: "", daysAgo: 31 },
  { serial: "SUM-01", board: "SUM", letter: "A", note: "", daysAgo: 17 },
  { serial: "OUT-01", board: "OUT", letter: "A", note: "Soldered, nothing tried yet.", daysAgo: 6 },
  { serial: "PAN-01", board: "PAN", letter: "A", note: "Stands beside the rack, ribbon to slot 8.", daysAgo: 27 },
  { serial: "BPL-01", board: "BPL", letter: "B", note: "", daysAgo: 96 },
];

/** Slot 7 waits for a third constituent. */
export const SLOTS: {
  position: number;
  label: string;
  pitchHp: number;
  board: string;
  unit?: string;
  daysAgo?: number;
}[] = [
  { position: 1, label: "", pitchHp: 5, board: "SUP", unit: "SUP-02", daysAgo: 62 },
  { position: 2, label: "", pitchHp: 5, board: "TIM", unit: "TIM-01", daysAgo: 56 },
  { position: 3, label: "M2", pitchHp: 5, board: "CON", unit: "CON-01", daysAgo: 30 },
  { position: 4, label: "S2", pitchHp: 5, board: "CON", unit: "CON-02", daysAgo: 24 },
  { position: 5, label: "", pitchHp: 5, board: "SIN", unit: "SIN-01", daysAgo: 12 },
  { position: 6, label: "", pitchHp: 5, board: "SUM", unit: "SUM-01", daysAgo: 9 },
  { position: 7, label: "N2", pitchHp: 5, board: "CON" },
  { position: 8, label: "", pitchHp: 5, board: "OUT", unit: "OUT-01", daysAgo: 2 },
];
