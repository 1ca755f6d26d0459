import { z } from "zod";
import type { ReworkKind, TouchKind } from "@/db/schema/faults";
import { checkId } from "@/lib/check/schema";
import { line, optionalLine, optionalLines } from "@/lib/form/text";
import { writeId } from "@/lib/form/write-id";

export const REWORK_KINDS = [
  "bodge-wire",
  "cut-track",
  "part-swap",
  "reflow",
  "firmware",
  "connector",
] as const satisfies readonly ReworkKind[];

export const TOUCH_KINDS = ["signal", "pin", "part", "block", "rail"] as const satisfies readonly TouchKind[];

export const REWORK_LIMITS = { what: 200, why: 2000, name: 60, names: 60, choices: 200 } as const;

const names = z
  .array(line(REWORK_LIMITS.name, "A name is empty. Take it out or write it."))
  .max(REWORK_LIMITS.names, `At most ${REWORK_LIMITS.names} names fit here.`)
  .transform((list) => [...new Set(list)]);

/** What a rework touches, by name as people write it. */
export const touches = z.object({ signals: names, pins: names, parts: names, blocks: names, rails: names });
export type Touches = z.output<typeof touches>;

const choice = z.object({ checkId, reason: optionalLine(300) });

const wire = z.object({
  number: line(20, "Give the wire a number, such as W3."),
  from: line(REWORK_LIMITS.name, "Say where the wire begins, such as U6-12."),
  to: line(REWORK_LIMITS.name, "Say where the wire ends, such as U9-3."),
  colour: optionalLine(30),
  out: z.boolean(),
});

const doubtFields = {
  project: z.string(),
  /** Serial. */
  unit: line(60, "Say which unit was reworked."),
  kind: z.enum(REWORK_KINDS, { message: "Choose what kind of rework it is." }),
  wire: wire.nullable(),
  touches,
  /** Checks that one puts in doubt oneself, and those that one takes out with a reason. */
  added: z.array(choice).max(REWORK_LIMITS.choices, `At most ${REWORK_LIMITS.choices} checks can be added.`),
  spared: z.array(choice).max(REWORK_LIMITS.choices, `At most ${REWORK_LIMITS.choices} checks can be spared.`),
};

/** Asks what a rework would put in doubt; a wire that is still being typed counts as far as it goes. */
export const previewReworkInput = z.object({
  ...doubtFields,
  wire: z.object({ from: optionalLine(REWORK_LIMITS.name), to: optionalLine(REWORK_LIMITS.name) }).nullable(),
});
export type PreviewReworkInput = z.output<typeof previewReworkInput>;

export const recordReworkInput = z
  .object({
    ...doubtFields,
    /** The rework's own id, too. */
    writeId,
    what: line(REWORK_LIMITS.what, "Say in a line what was done."),
    why: optionalLines(REWORK_LIMITS.why),
    faultId: z.uuid({ message: "This is not a fault." }).nullable(),
    carriedFrom: z.uuid({ message: "This is not a rework." }).nullable(),
    performedAt: z.iso.datetime({ offset: true, message: "Say when it was done." }).transform((text) => new Date(text)),
    /** Ids of the checks that the list named as doubtful when it was looked at. */
    seen: z.array(checkId).max(5000, "The list is too long. Look at it again."),
  })
  .superRefine(({ kind, wire: given, touches: named, spared }, context) => {
    if (kind === "bodge-wire" && !given)
      context.addIssue({ code: "custom", path: ["wire", "number"], message: "Say which wire, from where to where." });
    if (Object.values(named).every((list) => list.length === 0) && !given)
      context.addIssue({
        code: "custom",
        path: ["touches"],
        message: "Say what it touches: a signal, a pin, a part, a block or a rail. Without it nothing can be in doubt.",
      });
    spared.forEach(({ reason }, index) => {
      if (reason === "")
        context.addIssue({
          code: "custom",
          path: ["spared", index, "reason"],
          message: "Say why this check is spared. It stays on the traveler.",
        });
    });
  });
export type RecordReworkInput = z.output<typeof recordReworkInput>;
