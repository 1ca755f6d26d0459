import { LOGIC_PARTS, type LogicPart } from "@/lib/calc/logic-parts";
import {
  choosePackages,
  pack,
  type BlockDesign,
  type GateCount,
  type Packing,
  type PackingInput,
} from "@/lib/calc/packing";

export const HC = { name: "HC", technology: "CMOS" } as const;

export const gates = (counts: Record<string, number>): GateCount[] =>
  Object.entries(counts).map(([gateFunction, count]) => ({ gateFunction, count }));

export const block = (id: string, own: Record<string, number>, children: Record<string, number> = {}): BlockDesign => ({
  id,
  name: id,
  gates: gates(own),
  children: Object.entries(children).map(([child, count]) => ({ block: child, count })),
});

export function design(
  blocks: BlockDesign[],
  use: Record<string, number>,
  more: { loose?: Record<string, number>; mode?: PackingInput["mode"]; own?: LogicPart[] } = {},
): PackingInput {
  const loose = gates(more.loose ?? {});
  return {
    blocks,
    board: { use: Object.entries(use).map(([id, count]) => ({ block: id, count })), loose },
    packages: choosePackages(blocks, loose, more.own ?? []),
    family: HC,
    mode: more.mode ?? "pooled",
  };
}

export function packed(input: PackingInput): Packing {
  const result = pack(input);
  if (!result.ok) throw new Error(result.problems.map((problem) => problem.message).join(" "));
  return result.packing;
}

export function problemsOf(input: PackingInput) {
  const result = pack(input);
  return result.ok ? [] : result.problems;
}

/** A full adder of five gates, and of nine NANDs. */
export const FULL_ADDER = block("Full adder", { xor2: 2, and2: 2, or2: 1 });
export const NAND_ADDER = block("NAND adder", { nand2: 9 });

export const partNumbered = (number: string): LogicPart => {
  const part = LOGIC_PARTS.find((one) => one.number === number);
  if (!part) throw new Error(`there is no 74${number}`);
  return part;
};
