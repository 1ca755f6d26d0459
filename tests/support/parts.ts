import { randomUUID } from "node:crypto";
import type { ProjectScope } from "@/lib/access/scope";
import { saveBlock } from "@/lib/block/save-block";
import { saveBlockInput } from "@/lib/block/schema";
import { saveBoardPlan } from "@/lib/board-plan/save-board-plan";
import { saveBom } from "@/lib/board-plan/save-bom";
import { saveBoardPlanInput, saveBomInput } from "@/lib/board-plan/schema";

type Counts = Record<string, number | string>;

const rows = (field: string, counts: Counts) =>
  Object.entries(counts).map(([named, count]) => ({ [field]: named, count: String(count) }));

type BlockGiven = {
  block?: string;
  version?: number;
  name: string;
  summary?: string;
  /** By gate function, and by the id of the block inside. */
  gates?: Counts;
  children?: Counts;
};

/** Saves a block as the form does, through the input schema. */
export const keepBlock = (scope: ProjectScope, { gates = {}, children = {}, ...given }: BlockGiven) =>
  saveBlock(
    scope,
    saveBlockInput.parse({
      project: scope.slug,
      writeId: randomUUID(),
      block: "",
      version: 0,
      summary: "",
      gates: rows("gateFunction", gates),
      children: rows("block", children),
      ...given,
    }),
  );

export const FULL_ADDER = { name: "Full adder", gates: { xor2: 2, and2: 2, or2: 1 } };

type PlanGiven = { board: string; version?: number; blocks?: Counts } & Partial<
  Record<"packing" | "family" | "clockHz" | "activity" | "loadPf" | "unitsPlanned", string>
>;

/** Saves the plan of a board as the form does; blocks by their id. */
export const planBoard = (scope: ProjectScope, { blocks = {}, ...given }: PlanGiven) =>
  saveBoardPlan(
    scope,
    saveBoardPlanInput.parse({
      project: scope.slug,
      writeId: randomUUID(),
      version: 0,
      packing: "pooled",
      family: "HC",
      clockHz: "1 MHz",
      activity: "25 %",
      loadPf: "50 pF",
      unitsPlanned: "",
      blocks: rows("block", blocks),
      ...given,
    }),
  );

type Line = { partNumber: string; count: string; description?: string; designators?: string };

/** Saves the other parts of a board as the form does. */
export const listBoard = (
  scope: ProjectScope,
  { board, version, lines }: { board: string; version: number; lines: Line[] },
) =>
  saveBom(
    scope,
    saveBomInput.parse({
      project: scope.slug,
      writeId: randomUUID(),
      board,
      version,
      lines: lines.map((line) => ({ description: "", designators: "", ...line })),
    }),
  );
