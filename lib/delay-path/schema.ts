import { z } from "zod";
import { figure, optionalFigure } from "@/lib/form/figure-field";
import { line, optionalLine } from "@/lib/form/text";
import { countedRows } from "@/lib/form/whole-count";
import { writeId } from "@/lib/form/write-id";
import { readFigure } from "@/lib/form/figure";
import type { StoredPath } from "./path-shape";

const MOST_STEPS = 100;
const delay = { most: 1e-3, example: "7 ns" };
const typed = z.string().max(40, "This is too long for a figure.");

const step = z.object({
  part: z.string().max(80),
  family: z.string().trim().max(40, "At most 40 characters fit here."),
  name: optionalLine(80),
  count: z.string(),
  /** Empty: as the part's data has it. */
  minS: typed,
  typicalS: typed,
  maxS: typed,
});

const steps = countedRows(step, MOST_STEPS, (rows, say) =>
  rows.forEach(({ part, name }, index) => {
    if (part === "" && name === "") say(index, "name", "choose a part, or name what the signal passes.");
  }),
).transform((rows, context) =>
  rows.map((row, index) => {
    const seconds = (field: "minS" | "typicalS" | "maxS") => {
      const read = readFigure(row[field], "s", delay);
      if (read.ok) return read.value;
      context.addIssue({ code: "custom", path: [index, field], message: `Row ${index + 1}: ${read.message}` });
      return null;
    };
    return { ...row, minS: seconds("minS"), typicalS: seconds("typicalS"), maxS: seconds("maxS") };
  }),
);

/** A share of the typical delay, as a fraction; empty leaves the sum open. */
const share = (least: number, most: number, example: string) =>
  optionalFigure("%", { least, most, example }).transform((percent) => (percent === null ? null : percent / 100));

const volts = figure("V", "Say at which supply.", { least: 0.8, most: 24, example: "5 V" });
const load = figure("F", "Say into which load.", { most: 1e-6, example: "50 pF" }).transform((farad) =>
  Number((farad * 1e12).toPrecision(9)),
);
const condition = z.object({ volts, loadPf: load });
const known = (missing: string) => figure("s", missing, delay);

/** A path as its form holds it. */
export const typedPath = z
  .object({
    measure: optionalLine(120),
    steps,
    unknownMinShare: share(0, 100, "25 %"),
    unknownMaxShare: share(100, 1000, "200 %"),
    derating: z
      .object({
        family: line(40, "Choose the family of the outputs."),
        typicalAt: condition,
        limitsAt: condition,
        board: condition,
      })
      .nullable(),
    clock: z
      .object({
        clockToOutputMaxS: known("Say how long the first register takes at most."),
        setupS: known("Say how long before the clock the data must stand."),
        skewS: known("Say by how much the clocks may differ, or 0 ns."),
        holdS: optionalFigure("s", delay),
        clockToOutputMinS: optionalFigure("s", delay),
      })
      .nullable(),
  })
  .transform((path): StoredPath => path);
export type TypedPath = z.input<typeof typedPath>;

/** `path` is its id, or "" for a new one. */
export const saveDelayPathInput = z.object({
  project: z.string(),
  writeId,
  id: z.union([z.uuid(), z.literal("")], { message: "Name the path." }),
  version: z.int(),
  name: line(80, "Give the path a name."),
  /** Code of the board on which it is measured; empty: none. */
  board: z.string().max(20),
  path: typedPath,
});
export type SaveDelayPathInput = z.output<typeof saveDelayPathInput>;
export type SaveDelayPathTyped = z.input<typeof saveDelayPathInput>;

export const changeDelayPathInput = z.object({
  project: z.string(),
  writeId,
  id: z.uuid({ message: "Name the path." }),
});
export type ChangeDelayPathInput = z.output<typeof changeDelayPathInput>;
