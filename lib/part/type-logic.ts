import type { LogicPart } from "@/lib/calc/logic-parts";
import { formatQuantity } from "@/lib/calc/units";
import { writeGateLines, writePins } from "./pin-lines";
import type { TypedFigures, TypedLogic } from "./typed-logic";

export const EMPTY_FIGURES: TypedFigures = {
  family: "",
  staticA: "",
  cpdPf: "",
  cpdPer: "gate",
  tpdTypicalS: "",
  tpdMaxS: "",
  note: "",
};

export const EMPTY_LOGIC: TypedLogic = {
  name: "",
  gateFunction: "",
  output: "push-pull",
  pins: "14",
  gatesPerPackage: "4",
  inputsPerGate: "2",
  outputsPerGate: "1",
  bitsPerGate: "1",
  gates: "",
  sharedInputs: "",
  sharedOutputs: "",
  unconnectedPins: "",
  powerPins: "14",
  groundPins: "7",
  inputPf: "3.5 pF",
  figures: [],
  source: "",
};

const write = (value: number | null, unit: "A" | "F" | "s") =>
  value === null ? "" : formatQuantity({ value, unit }, {}).replace("\u202f", " ");

/** Logic data as a form shows it; reading it again gives the same. */
export function typeLogic(part: LogicPart): TypedLogic {
  const { name, gateFunction, output, source } = part;
  return {
    ...{ name, gateFunction, output, source },
    pins: String(part.pins),
    gatesPerPackage: String(part.gatesPerPackage),
    inputsPerGate: String(part.inputsPerGate),
    outputsPerGate: String(part.outputsPerGate),
    bitsPerGate: String(part.bitsPerGate),
    gates: writeGateLines(part.pinout),
    sharedInputs: writePins(part.sharedInputs),
    sharedOutputs: writePins(part.sharedOutputs),
    unconnectedPins: writePins(part.unconnectedPins),
    powerPins: writePins(part.powerPins),
    groundPins: writePins(part.groundPins),
    inputPf: write(part.inputPf / 1e12, "F"),
    figures: Object.entries(part.perFamily).map(([family, figures]) => ({
      family,
      staticA: write(figures.staticA, "A"),
      cpdPf: write(figures.cpdPf === null ? null : figures.cpdPf / 1e12, "F"),
      cpdPer: figures.cpdPer,
      tpdTypicalS: write(figures.tpdTypicalS, "s"),
      tpdMaxS: write(figures.tpdMaxS, "s"),
      note: figures.note,
    })),
  };
}
