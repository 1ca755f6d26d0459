import { formatQuantity, type Unit } from "@/lib/calc/units";
import type { PowerLineItem } from "./line-item";
import type { TypedLine } from "./typed-line";

const write = (value: number, unit: Unit) => formatQuantity({ value, unit });
const percent = (share: number) => write(Number((share * 100).toPrecision(9)), "%");

export const LINE_KINDS: readonly { kind: PowerLineItem["kind"]; name: string; about: string }[] = [
  { kind: "led", name: "LEDs", about: "Lit through a resistor from the rail." },
  { kind: "pull-up", name: "Pull-ups", about: "Take current while their line is low." },
  { kind: "regulator", name: "Regulator", about: "Makes a rail of the board from another one." },
  { kind: "fixed", name: "Other part", about: "A figure from its data sheet: a memory, a display, a relay." },
  { kind: "whole", name: "Whole board", about: "Measured or known for all of it; stands instead of the sum." },
];

/** An empty form of one kind, with what is most often right. */
export function blankLine(kind: PowerLineItem["kind"], rail: string): TypedLine {
  const named = { label: "", rail, count: "1" };
  if (kind === "led") return { kind, ...named, forwardVolts: "2 V", ohm: "", litTypical: "50 %", litWorst: "100 %" };
  if (kind === "pull-up") return { kind, ...named, ohm: "", lowVolts: "0.4 V", lowTypical: "25 %", lowWorst: "100 %" };
  if (kind === "regulator") {
    const sizes = { groundA: "5 mA", efficiency: "85 %" };
    return { kind, label: "", rail, output: "", outputVolts: "3.3 V", type: "linear", ...sizes };
  }
  if (kind === "fixed") return { kind, ...named, typicalA: "", worstA: "", atRest: "100 %" };
  return { kind, label: "", rail, typicalA: "", worstA: "" };
}

/** A kept line as its form holds it. */
export function writeLine(item: PowerLineItem): TypedLine {
  if (item.kind === "led") {
    const { kind, label, rail, lit } = item;
    const figures = { forwardVolts: write(item.forwardVolts, "V"), ohm: write(item.ohm, "Ω") };
    const shares = { litTypical: percent(lit.typical), litWorst: percent(lit.worst) };
    return { kind, label, rail, count: String(item.count), ...figures, ...shares };
  }
  if (item.kind === "pull-up") {
    const { kind, label, rail, lowShare } = item;
    const figures = { ohm: write(item.ohm, "Ω"), lowVolts: write(item.lowVolts, "V") };
    const shares = { lowTypical: percent(lowShare.typical), lowWorst: percent(lowShare.worst) };
    return { kind, label, rail, count: String(item.count), ...figures, ...shares };
  }
  if (item.kind === "regulator") {
    const { kind, label, rail, output, type } = item;
    const blank = { groundA: "5 mA", efficiency: "85 %" };
    const own =
      type.kind === "linear" ? { groundA: write(type.groundA, "A") } : { efficiency: percent(type.efficiency) };
    return { kind, label, rail, output, outputVolts: write(item.outputVolts, "V"), type: type.kind, ...blank, ...own };
  }
  const { label, rail } = item;
  const figures = { typicalA: write(item.typicalA, "A"), worstA: write(item.worstA, "A") };
  if (item.kind === "whole") return { kind: item.kind, label, rail, ...figures };
  return { kind: item.kind, label, rail, count: String(item.count), ...figures, atRest: percent(item.atRest) };
}

/** "8 × Phase lamps", "the whole board from +5V: 0.24 A": a line in a few words, for the log and for questions. */
export function lineWords(item: PowerLineItem): string {
  if (item.kind === "whole") return `the whole board from ${item.rail}, ${write(item.worstA, "A")} at worst`;
  if (item.kind === "regulator") return `${item.label}, ${item.output} from ${item.rail}`;
  return `${item.count} × ${item.label}`;
}
