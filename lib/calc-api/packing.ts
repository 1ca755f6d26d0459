import { z } from "zod";
import { findFamily, FAMILIES } from "@/lib/calc/levels";
import { findPart, gateFunctionName, LOGIC_PARTS, type LogicPart } from "@/lib/calc/logic-parts";
import { choosePackages, pack } from "@/lib/calc/packing";
import { defineCalculation, type Outcome } from "./define-calculation";
import { count, name } from "./fields";

const functions = [...new Set(LOGIC_PARTS.map((part) => part.gateFunction))];

const gates = z
  .array(z.strictObject({ gateFunction: name, count }))
  .max(200)
  .describe(`Gate functions: ${functions.join(", ")}.`);
const uses = z.array(z.strictObject({ block: name, count })).max(200);

const input = z.strictObject({
  blocks: z
    .array(z.strictObject({ name, gates: gates.default([]), children: uses.default([]) }))
    .max(500)
    .default([]),
  board: z.strictObject({ use: uses.default([]), loose: gates.default([]) }),
  parts: z
    .record(name, z.string().max(20))
    .default({})
    .describe('Part number by gate function where another than the usual part is wanted: {"xor2": "86"}.'),
  family: z.string().trim().min(1).max(40).default("HC"),
  mode: z.enum(["pooled", "per-block"]).default("pooled"),
});

export const packing = defineCalculation({
  name: "packing",
  about: "Gates of blocks to packages, pooled or a package set a block; spare gates and how to tie their inputs.",
  source:
    "Packages of a function: ⌈gates / gates per package⌉. Spare inputs of CMOS to ground or supply, of TTL left at a level through a resistor; one 100 nF a package and bulk: common practice, no source. Pin numbers from memory, compared once with a public symbol library.",
  leavesOut: "One function done by another's spare gates, distances on the board, whether gates may share a select.",
  most: "500 blocks, 20,000 gates.",
  input,
  example: {
    blocks: [
      {
        name: "Full adder",
        gates: [
          { gateFunction: "xor2", count: 2 },
          { gateFunction: "and2", count: 2 },
          { gateFunction: "or2", count: 1 },
        ],
      },
    ],
    board: { use: [{ block: "Full adder", count: 4 }] },
    family: "HC",
    mode: "pooled",
  },
  run: ({ blocks, board, parts, family, mode }): Outcome => {
    const technology = findFamily(FAMILIES, family)?.technology;
    if (!technology) return { ok: false, fields: { family: `There is no family ${family} here.` } };
    const designs = blocks.map((block) => ({ id: block.name, ...block }));
    const chosen: Record<string, LogicPart> = {};
    for (const [gateFunction, number] of Object.entries(parts)) {
      const part = findPart(number);
      if (!part || part.gateFunction !== gateFunction) {
        const message = `Part ${number} does not do “${gateFunctionName(gateFunction)}”.`;
        return { ok: false, fields: { [`parts.${gateFunction}`]: message } };
      }
      chosen[gateFunction] = part;
    }
    const packages = { ...choosePackages(designs, board.loose), ...chosen };
    const packed = pack({ blocks: designs, board, packages, family: { name: family, technology }, mode });
    if (packed.ok) return { ok: true, result: packed.packing };
    return { ok: false, fields: Object.fromEntries(packed.problems.map(({ row, message }) => [row, message])) };
  },
});
