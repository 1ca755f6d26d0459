import { z } from "zod";
import { figure } from "@/lib/form/figure-field";
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

const clockHz = figure("Hz", "Say how often the logic moves.", { most: 1e9, example: "1.8432 MHz" });
const activity = figure("%", "Say which share of the outputs moves.", { most: 100, example: "25 %" });
const loadFarad = figure("F", "Say what an output drives.", { most: 1e-6, example: "50 pF" });

/** Without what the change of unit adds: 50 pF is 50, not 49.99999999999999. */
const exact = (value: number) => Number(value.toPrecision(9));

export const saveBoardPlanInput = z.object({
  ...ofPlan,
  packing: z.enum(["pooled", "per-block"], { message: "Choose how packages are shared." }),
  family: line(40, "Choose the family of the packages."),
  clockHz,
  activity: activity.transform((percent) => exact(percent / 100)),
  loadPf: loadFarad.transform((farad) => exact(farad * 1e12)),
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
