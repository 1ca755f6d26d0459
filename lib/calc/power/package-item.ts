import { partLabel, type LogicPart } from "../logic-parts";
import { type PackageItem } from "./item";

/** Typical current at rest as a share of the highest. CMOS: leakage, next to nothing; bipolar: common practice, no source. */
const TYPICAL_AT_REST = { CMOS: 0, bipolar: 0.6 } as const;

export type PackagePlan = {
  rail: string;
  family: { name: string; technology: keyof typeof TYPICAL_AT_REST };
  /** Of the board's clock, Hz. */
  clockHz: number;
  /** Share of the lines that change at a clock edge that counts: 0 … 1. */
  activity: number;
  loadPf: number;
};

/**
 * Packages of a part at work on a board: `gatesUsed` gates over `count` packages.
 * A line that changes at each clock goes to and fro at half the clock, so fi = fo = clock / 2 · activity typically and
 * clock / 2 at worst. Leaves out glitches, which in deep logic may double it, and lines faster than the board's clock:
 * add those as items of their own.
 */
export function packageItem(part: LogicPart, count: number, gatesUsed: number, plan: PackagePlan): PackageItem {
  const { family, clockHz, activity, loadPf, rail } = plan;
  const figures = Object.hasOwn(part.perFamily, family.name) ? part.perFamily[family.name] : undefined;
  const staticA = figures?.staticA ?? null;
  const gates = count === 0 ? 0 : gatesUsed / count;
  const hz = { typical: (clockHz / 2) * activity, worst: clockHz / 2 };
  return {
    kind: "package",
    label: partLabel(part, family.name),
    rail,
    count,
    staticA: staticA === null ? null : { typical: staticA * TYPICAL_AT_REST[family.technology], worst: staticA },
    cpdPf: figures?.cpdPf ?? null,
    switching: figures?.cpdPer === "package" ? 1 : gates * part.bitsPerGate,
    inputHz: hz,
    outputs: gates * part.outputsPerGate,
    outputHz: hz,
    loadPf,
    ttlInputs: null,
  };
}
