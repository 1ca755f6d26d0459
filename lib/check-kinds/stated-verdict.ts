import type { Judged, JudgeContext, Requires } from "./kind";

/** What a builder enters where the eye judges. Null until one of the two has been touched. */
export type StatedEntry = { conforms: boolean | null };

export function isStatedEntry(value: unknown): value is StatedEntry {
  if (typeof value !== "object" || value === null || !("conforms" in value)) return false;
  return value.conforms === null || typeof value.conforms === "boolean";
}

export const state = (conforms: boolean): StatedEntry => ({ conforms });

export const NOTHING_STATED: StatedEntry = { conforms: null };

/** The builder's own verdict, once what must go with it is there: the evidence, and a note when it does not conform. */
export function judgeStated(
  entry: StatedEntry,
  context: JudgeContext,
  requires?: Requires & { missing: string },
): Judged {
  if (requires) {
    const there = context.evidence.filter((kind) => requires.kinds.includes(kind)).length;
    if (there < requires.minimum)
      return { ok: false, message: requires.missing, fields: { attachmentIds: requires.missing } };
  }
  if (entry.conforms === null) {
    const message = "Say whether it conforms.";
    return { ok: false, message, fields: { conforms: message } };
  }
  if (entry.conforms) return { ok: true, verdict: "conforms", readings: [], sentences: [] };
  if (context.note.trim() === "") {
    const message = "Say in the note what does not conform.";
    return { ok: false, message, fields: { note: message } };
  }
  return { ok: true, verdict: "does-not-conform", readings: [], sentences: [] };
}

export const summariseStated = (entry: StatedEntry): string => (entry.conforms ? "conforms" : "does not conform");
