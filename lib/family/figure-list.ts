import { formatQuantity, type Unit } from "@/lib/calc/units";

/** One figure of a data sheet as people type it. */
type Figure = {
  /** Symbol of the sheet and its meaning: "VIH, lowest high at an input". */
  label: string;
  unit: Unit;
  /** Of the stored figure in the base unit: 1e-12 where picofarads are kept. */
  scale: number;
  /** More than this is a slip of the prefix. */
  most: number;
  example: string;
  /** May be left empty. */
  optional?: true;
  /** Sheets print currents with the sign of their direction; only the magnitude counts. */
  magnitude?: true;
};

const volts = (label: string, example: string): Figure => ({ label, unit: "V", scale: 1, most: 30, example });
const amps = (label: string, example: string): Figure => ({
  label,
  unit: "A",
  scale: 1,
  most: 0.5,
  example,
  magnitude: true,
});
const farads = (label: string, example: string): Figure => ({ label, unit: "F", scale: 1e-12, most: 1e-9, example });
const seconds = (label: string, example: string): Figure => ({ label, unit: "s", scale: 1, most: 1e-4, example });

/** In the order of a data sheet; the names are those of Family in lib/calc/levels. */
export const FIGURES = {
  volts: volts("VCC, supply the figures are for", "4.5 V"),
  vihMin: volts("VIH, lowest high an input takes", "3.15 V"),
  vilMax: volts("VIL, highest low an input takes", "1.35 V"),
  vohMin: volts("VOH, lowest high an output gives", "3.84 V"),
  iohA: amps("IOH, current at that high", "4 mA"),
  volMax: volts("VOL, highest low an output gives", "0.33 V"),
  iolA: amps("IOL, current at that low", "4 mA"),
  iihA: amps("IIH, into an input at high", "1 µA"),
  iilA: amps("IIL, out of an input at low", "1 µA"),
  iozA: amps("IOZ, leak of an output that is off", "5 µA"),
  inputPf: farads("CI, capacitance of an input", "3.5 pF"),
  outputPf: farads("CO, of an output that is off", "10 pF"),
  tpdTypicalS: { ...seconds("tpd, typical delay into 50 pF", "9 ns"), optional: true },
  edgeS: seconds("Edge of an output into 50 pF, 10–90 %", "7 ns"),
  inputMaxVolts: { ...volts("Highest voltage an input bears", "7 V"), optional: true },
  minVolts: { ...volts("Lowest supply it may be used at", "4.5 V"), optional: true },
  maxVolts: { ...volts("Highest supply it may be used at", "5.5 V"), optional: true },
} as const satisfies Record<string, Figure>;

export type FigureName = keyof typeof FIGURES;

// Object.keys() gives the very keys of the record; the compiler widens them to string.
export const FIGURE_NAMES = Object.keys(FIGURES) as FigureName[];

export const figureOf = (name: FigureName): Figure => FIGURES[name];

/** "3.84 V", "0.33 V", "400 µA", "3.5 pF"; empty where a sheet says nothing. Sheets print volts without a prefix. */
export function writeFigure(name: FigureName, stored: number | null | undefined): string {
  if (stored === null || stored === undefined) return "";
  const { unit, scale } = FIGURES[name];
  if (unit === "V") return `${Number(stored.toPrecision(6))}\u202fV`;
  return formatQuantity({ value: stored * scale, unit });
}
