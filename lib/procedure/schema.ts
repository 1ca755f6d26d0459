import { z } from "zod";
import { checkKindName } from "@/lib/check-kinds/list";
import { parsePin } from "@/lib/calc/connector";
import { line, optionalLine, optionalLines } from "@/lib/form/text";
import { writeId } from "@/lib/form/write-id";
import { STARTER_IDS } from "./starters/starter-ids";

const MOST_NAMES = 100;
export const MOST_CHECKS = 300;
export const MOST_CAUTION = 2000;

const names = z
  .array(line(60, "Name it."))
  .max(MOST_NAMES, `At most ${MOST_NAMES} names fit here.`)
  .transform((list) => [...new Set(list)]);

const pins = names.refine(
  (list) => list.every((pin) => parsePin(pin) !== undefined),
  "Write pins as the connector names them, separated by commas: J1 a4, J1 c4.",
);

/** One check as the editor's form holds it; what belongs to the kind is read by the kind (read-check.ts). */
export const checkFields = z.object({
  stage: z.enum(["inspection", "continuity", "power-on", "function", "integration"], { message: "Choose a stage." }),
  title: line(200, "Say in one line what is checked."),
  instruction: optionalLines(4000),
  caution: optionalLines(MOST_CAUTION),
  reference: optionalLine(200),
  holdPoint: z.boolean(),
  kind: checkKindName,
  typed: z.unknown(),
  covers: z.object({ signals: names, pins, rails: names, blocks: names }),
  needs: z.array(z.uuid()).max(50, "At most 50 checks fit here."),
});
export type CheckFields = z.output<typeof checkFields>;

const ofDraft = {
  project: z.string(),
  writeId,
  /** Code of the board. */
  board: z.string(),
  /** Version of the draft that was looked at. */
  version: z.int(),
};

export const startDraftInput = z.object({
  project: z.string(),
  writeId,
  board: z.string(),
  from: z.enum(["scratch", "issued", ...STARTER_IDS], { message: "Choose what to begin with." }),
});
export type StartDraftInput = z.output<typeof startDraftInput>;

export const saveCheckInput = z.object({
  ...ofDraft,
  /** Null adds a check; the key of a deleted one brings it back under the same key. */
  key: z.uuid().nullable(),
  /** Where a new one goes: after this check; null: at the end of its stage. */
  after: z.uuid().nullable(),
  check: checkFields,
});
export type SaveCheckInput = z.output<typeof saveCheckInput>;

export const deleteCheckInput = z.object({ ...ofDraft, key: z.uuid() });
export type DeleteCheckInput = z.output<typeof deleteCheckInput>;

export const reorderChecksInput = z.object({ ...ofDraft, keys: z.array(z.uuid()).max(MOST_CHECKS) });
export type ReorderChecksInput = z.output<typeof reorderChecksInput>;

export const issueProcedureInput = z.object({ ...ofDraft, note: optionalLines(2000) });
export type IssueProcedureInput = z.output<typeof issueProcedureInput>;

export const discardDraftInput = z.object(ofDraft);
export type DiscardDraftInput = z.output<typeof discardDraftInput>;
