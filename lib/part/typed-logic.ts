import { z } from "zod";
import type { FamilyFigures, GatePins, LogicPart } from "@/lib/calc/logic-parts";
import { readFigure } from "@/lib/form/figure";
import { line, optionalLine, optionalLines } from "@/lib/form/text";
import { readCount } from "@/lib/form/whole-count";
import { readGateLines, readPins } from "./pin-lines";
import { sayTwice } from "./pins-twice";

const MOST_FAMILIES = 20;
const text = z.string().max(400, "This is too long.");

const typedFigures = z.object({
  family: line(40, "Name the family, such as HC."),
  /** Figures as the data sheet has them: "20 µA", "22 pF", "7 ns"; empty: none. */
  staticA: text,
  cpdPf: text,
  cpdPer: z.enum(["gate", "package"], { message: "Say what the Cpd is of." }),
  tpdTypicalS: text,
  tpdMaxS: text,
  note: optionalLine(200),
});
export type TypedFigures = z.input<typeof typedFigures>;

const typedFields = z.object({
  name: line(120, "Say what the part is, such as Quad 2-input NAND."),
  /** "nand2" or a name of the project's own. */
  gateFunction: line(60, "Say what one gate of it does."),
  output: z.enum(["push-pull", "three-state", "open-drain"], { message: "Choose the kind of output." }),
  pins: text,
  gatesPerPackage: text,
  inputsPerGate: text,
  outputsPerGate: text,
  bitsPerGate: text,
  gates: optionalLines(2000),
  sharedInputs: text,
  sharedOutputs: text,
  unconnectedPins: text,
  powerPins: text,
  groundPins: text,
  inputPf: text,
  figures: z.array(typedFigures).max(MOST_FAMILIES, `At most ${MOST_FAMILIES} families fit here.`),
  source: line(300, "Say where the figures come from, such as the data sheet and its date."),
});
export type TypedLogic = z.input<typeof typedFields>;
type Fields = z.output<typeof typedFields>;
type Say = (path: PropertyKey[], message: string) => void;

/** Logic data without the number, which belongs to the part. */
export const typedLogic = typedFields.transform((typed, context): Omit<LogicPart, "number"> => {
  const say: Say = (path, message) => context.addIssue({ code: "custom", path, message });
  const count = (field: "pins" | "gatesPerPackage" | "inputsPerGate" | "outputsPerGate" | "bitsPerGate", least = 1) => {
    const read = readCount(typed[field], { least, most: 400 });
    if (typeof read === "number") return read;
    say([field], capital(read.message));
    return least;
  };
  const pins = count("pins", 2);
  const gatesPerPackage = count("gatesPerPackage");
  const pinout = gatePins(typed, pins, gatesPerPackage, say);
  const list = (field: "sharedInputs" | "sharedOutputs" | "unconnectedPins" | "powerPins" | "groundPins") => {
    const read = readPins(typed[field], pins);
    if (!read.ok) say([field], read.message);
    return read.ok ? read.value : [];
  };
  const lists = {
    sharedInputs: list("sharedInputs"),
    sharedOutputs: list("sharedOutputs"),
    unconnectedPins: list("unconnectedPins"),
    powerPins: list("powerPins"),
    groundPins: list("groundPins"),
  };
  sayTwice(pinout, lists, (field, message) => say([field], message));
  return {
    name: typed.name,
    gateFunction: typed.gateFunction,
    output: typed.output,
    pins,
    gatesPerPackage,
    bitsPerGate: count("bitsPerGate"),
    inputsPerGate: count("inputsPerGate", 0),
    outputsPerGate: count("outputsPerGate", 0),
    pinout,
    ...lists,
    inputPf: picofarads(figure(typed.inputPf, "F", ["inputPf"], say)) ?? 0,
    perFamily: figuresOf(typed.figures, say),
    source: typed.source,
  };
});

const capital = (sentence: string) => sentence.charAt(0).toUpperCase() + sentence.slice(1);

function gatePins(typed: Fields, pins: number, gates: number, say: Say): GatePins[] | null {
  const read = readGateLines(typed.gates, pins);
  if (!read.ok) {
    say(["gates"], read.message);
    return null;
  }
  if (read.value && read.value.length !== gates) {
    say(["gates"], `There are ${read.value.length} lines for ${gates} gates. Write one line a gate, or none.`);
  }
  return read.value;
}

function figuresOf(rows: Fields["figures"], say: Say): Record<string, FamilyFigures> {
  const found: Record<string, FamilyFigures> = {};
  rows.forEach(({ family, cpdPer, note, ...typed }, index) => {
    if (Object.hasOwn(found, family)) say(["figures", index, "family"], `${family} stands in an earlier row already.`);
    const read = (field: keyof typeof typed, unit: keyof typeof KINDS) =>
      figure(typed[field], unit, ["figures", index, field], say);
    const tpdTypicalS = read("tpdTypicalS", "s");
    const tpdMaxS = read("tpdMaxS", "s");
    if (tpdTypicalS !== null && tpdMaxS !== null && tpdMaxS < tpdTypicalS) {
      say(["figures", index, "tpdMaxS"], "The longest delay is below the typical one.");
    }
    const cpdPf = picofarads(read("cpdPf", "F"));
    found[family] = { staticA: read("staticA", "A"), cpdPf, cpdPer, tpdTypicalS, tpdMaxS, note };
  });
  return found;
}

const KINDS = {
  F: { most: 1e-6, example: "22 pF" },
  s: { most: 1e-3, example: "7 ns" },
  A: { most: 10, example: "20 µA" },
};

function figure(typed: string, unit: keyof typeof KINDS, path: PropertyKey[], say: Say): number | null {
  const read = readFigure(typed, unit, KINDS[unit]);
  if (read.ok) return read.value;
  say(path, read.message);
  return null;
}

/** The double nearest to the picofarads that were typed: 22 pF is 22, not 21.999999999999996. */
const picofarads = (farad: number | null): number | null =>
  farad === null ? null : Number((farad * 1e12).toPrecision(12));
