import { FIGURES } from "./figures";
import { type GatePins, type LogicPart, type PartOutput } from "./part";

const SOURCE =
  "Pin numbers from memory, each compared once with a public symbol library. Figures: see the note of each family.";
/** Typical of HC and HCT inputs, pF; from memory. */
const INPUT_PF = 3.5;

type Description = {
  number: string;
  name: string;
  gateFunction: string;
  bitsPerGate?: number;
  output?: PartOutput;
  pins: number;
  pinout: GatePins[];
  sharedInputs?: number[];
  sharedOutputs?: number[];
  unconnectedPins?: number[];
};

export const gate = (inputs: number[], outputs: number[], restHigh: number[] = []): GatePins => ({
  inputs,
  outputs,
  restHigh,
});

/** A part whose ground and supply are at the two usual corners: the last pin of the first row and the last pin of all. */
export function describePart(part: Description): LogicPart {
  return {
    number: part.number,
    name: part.name,
    gateFunction: part.gateFunction,
    gatesPerPackage: part.pinout.length,
    bitsPerGate: part.bitsPerGate ?? 1,
    inputsPerGate: part.pinout[0]?.inputs.length ?? 0,
    outputsPerGate: part.pinout[0]?.outputs.length ?? 0,
    output: part.output ?? "push-pull",
    pins: part.pins,
    pinout: part.pinout,
    sharedInputs: part.sharedInputs ?? [],
    sharedOutputs: part.sharedOutputs ?? [],
    unconnectedPins: part.unconnectedPins ?? [],
    powerPins: [part.pins],
    groundPins: [part.pins / 2],
    inputPf: INPUT_PF,
    perFamily: FIGURES[part.number] ?? {},
    source: SOURCE,
  };
}
