import { z } from "zod";
import { readFigure } from "@/lib/form/figure";
import { line, optionalLine } from "@/lib/form/text";
import { countedRows, namedOnce, readCount } from "@/lib/form/whole-count";
import { writeId } from "@/lib/form/write-id";

const MOST_BLOCKS = 100;
const MOST_LINES = 400;

const ofPlan = {
  project: z.string(),
  writeId,
  /** Code of the board. */
  board: z.string(),
  /** Version of the plan that was looked at; 0 while there is none. */
  version: z.int(),
};

type Kind = { unit: "Hz" | "F" | "%"; least: number; most: number; example: string; missing: string };

/** A figure that must be there, kept as `scale` says: 50 pF as 50. */
const figure = ({ unit, missing, ...bounds }: Kind, scale: number) =>
  z.string({ message: missing }).transform((typed, context) => {
    const read = readFigure(typed, unit, bounds);
    const message = !read.ok ? read.message : read.value === null ? missing : undefined;
    if (read.ok && read.value !== null) return Number((read.value * scale).toPrecision(12));
    context.addIssue({ code: "custom", message: message ?? missing });
    return z.NEVER;
  });

const clock: Kind = {
  unit: "Hz",
  least: 0,
  most: 1e9,
  example: "1.8432 MHz",
  missing: "Say how often the logic moves.",
};
const activity: Kind = {
  unit: "%",
  least: 0,
  most: 100,
  example: "25 %",
  missing: "Say which share of the outputs moves.",
};
const load: Kind = { unit: "F", least: 0, most: 1e-6, example: "50 pF", missing: "Say what an output drives." };

export const saveBoardPlanInput = z.object({
  ...ofPlan,
  packing: z.enum(["pooled", "per-block"], { message: "Choose how packages are shared." }),
  family: line(40, "Choose the family of the packages."),
  clockHz: figure(clock, 1),
  activity: figure(activity, 0.01),
  loadPf: figure(load, 1e12),
  /** Empty: as many as there are. */
  unitsPlanned: z.string().transform((typed, context): number | null => {
    if (typed.trim() === "") return null;
    const read = readCount(typed, { least: 0, most: 1000 });
    if (typeof read === "number") return read;
    context.addIssue({ code: "custom", message: `Units: ${read.message}` });
    return z.NEVER;
  }),
  blocks: countedRows(z.object({ block: z.string(), count: z.string() }), MOST_BLOCKS, namedOnce("block", "a block")),
});
export type SaveBoardPlanInput = z.output<typeof saveBoardPlanInput>;
export type SaveBoardPlanTyped = z.input<typeof saveBoardPlanInput>;

const bomLine = z.object({
  partNumber: z.string().trim().max(80, "At most 80 characters fit here."),
  description: optionalLine(200),
  count: z.string(),
  designators: optionalLine(200),
});

export const saveBomInput = z.object({
  ...ofPlan,
  lines: countedRows(bomLine, MOST_LINES, (rows, say) =>
    rows.forEach(({ partNumber }, index) => {
      if (partNumber === "") say(index, "partNumber", "give the part its number.");
    }),
  ),
});
export type SaveBomInput = z.output<typeof saveBomInput>;
export type SaveBomTyped = z.input<typeof saveBomInput>;

export const tieSparesInput = z.object({ ...ofPlan, tied: z.boolean() });
export type TieSparesInput = z.output<typeof tieSparesInput>;
