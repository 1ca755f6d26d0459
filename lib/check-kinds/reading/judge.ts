import { judgeReading } from "../judge-reading";
import type { Judged, JudgeContext } from "../kind";
import type { Entry, Spec } from "./schema";

export function judge(spec: Spec, entry: Entry, context: JudgeContext): Judged {
  const one = judgeReading({ label: "", typed: entry.typed, unit: spec.unit, limits: spec.limits }, context);
  if (!one.ok) return { ok: false, message: one.message, fields: { typed: one.message } };
  return { ok: true, verdict: one.reading.verdict, readings: [one.reading], sentences: one.sentences };
}
