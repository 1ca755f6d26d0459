import { z } from "zod";
import type { FaultState } from "@/db/schema/faults";
import { line, optionalLine, optionalLines } from "@/lib/form/text";
import { writeId } from "@/lib/form/write-id";

export const FAULT_STATES = ["open", "traced", "mended", "no-fault"] as const satisfies readonly FaultState[];

export const FAULT_LIMITS = { title: 160, text: 5000, name: 60, names: 40 } as const;

const names = z
  .array(line(FAULT_LIMITS.name, "A name is empty. Take it out or write it."))
  .max(FAULT_LIMITS.names, `At most ${FAULT_LIMITS.names} names fit here.`)
  .transform((list) => [...new Set(list)]);

const text = optionalLines(FAULT_LIMITS.text);

/** Hours as people type them: "2", "1.5", "1,5", "0:45", "45 min"; null when nothing is typed. */
const hours = z
  .string({ message: "Write the hours such as 1.5 or 0:45." })
  .trim()
  .max(20, "This is too long for hours.")
  .transform((typed, context) => {
    const value = readHours(typed);
    if (value !== undefined) return value;
    context.addIssue({ code: "custom", message: `“${typed}” is no time. Write it such as 1.5, 0:45 or 45 min.` });
    return z.NEVER;
  });

/** Undefined when it cannot be read. */
function readHours(typed: string): number | null | undefined {
  if (typed === "") return null;
  const [, clockHours, minutes] = /^(\d{1,4}):([0-5]\d)$/.exec(typed) ?? [];
  if (clockHours !== undefined && minutes !== undefined) return Number(clockHours) + Number(minutes) / 60;
  const [, figure, unit = "h"] = /^(\d{1,4}(?:[.,]\d{1,3})?)\s*(h|hours?|min|minutes?)?$/i.exec(typed) ?? [];
  if (figure === undefined) return undefined;
  const value = Number(figure.replace(",", "."));
  return unit.toLowerCase().startsWith("m") ? value / 60 : value;
}

/** What is written of a fault, the same when it is opened and later. */
export const faultFields = z.object({
  title: line(FAULT_LIMITS.title, "Give the fault a title: what is wrong, in a few words."),
  symptom: text,
  suspected: text,
  tried: text,
  cause: text,
  mend: text,
  lesson: text,
  nextRevision: text,
  hours,
  signals: names,
  pins: names,
  state: z.enum(FAULT_STATES, { message: "Choose how it stands." }),
});
export type FaultFields = z.output<typeof faultFields>;

type Saying = Pick<FaultFields, "state" | "cause" | "mend">;

/** A state says something is known: then it is written down, too. */
function sayWhatIsMissing({ state, cause, mend }: Saying, context: z.core.$RefinementCtx<Saying>) {
  const ask = (field: "cause" | "mend", message: string) =>
    context.addIssue({ code: "custom", path: [field], message });
  if (state === "traced" && cause === "") ask("cause", "It is traced: write the cause that was found.");
  if (state === "mended" && mend === "") ask("mend", "It is mended: write what was done.");
  if (state === "no-fault" && cause === "") ask("cause", "Write why it was no fault.");
}

const fields = faultFields.shape;

export const openFaultInput = z
  .object({
    project: z.string(),
    writeId,
    ...fields,
    /** Serial. */
    unit: line(60, "Choose the unit that it was seen on."),
    checkId: z.uuid({ message: "This is not the id of a check." }).nullable(),
    attemptId: z.uuid({ message: "This is not the id of an attempt." }).nullable(),
    probePlanId: z.uuid({ message: "This is not the id of a round of probing." }).nullable(),
  })
  .superRefine(sayWhatIsMissing);
export type OpenFaultInput = z.output<typeof openFaultInput>;

export const editFaultInput = z
  .object({
    project: z.string(),
    writeId,
    ...fields,
    faultId: z.uuid({ message: "Name the fault." }),
    version: z.int(),
  })
  .superRefine(sayWhatIsMissing);
export type EditFaultInput = z.output<typeof editFaultInput>;

export const similarInput = z.object({
  project: z.string(),
  /** Number of the fault that is being written, which is not similar to itself. */
  except: z.int().nullable(),
  words: optionalLine(2000),
  signals: names,
  pins: names,
});
export type SimilarInput = z.output<typeof similarInput>;
