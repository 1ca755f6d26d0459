import type { InstrumentRange } from "@/db/schema/people";
import type { AttachmentKind } from "@/db/schema/evidence";
import { reject } from "@/lib/actions/answer";
import type { ProjectScope } from "@/lib/access/scope";
import type { Judged } from "@/lib/check-kinds/kind";
import { checkKind } from "@/lib/check-kinds/list";
import type { RecordAttemptInput } from "./schema";

type With = {
  check: { kind: string; spec: unknown };
  instrument: { ranges: InstrumentRange[] } | undefined;
  evidence: AttachmentKind[];
};

/** What was entered, read by its kind and judged; anything that is no verdict rolls the change back with its sentence. */
export function judgeAttempt(
  scope: ProjectScope,
  input: RecordAttemptInput,
  { check, instrument, evidence }: With,
): { entry: unknown; judged: Extract<Judged, { ok: true }> } {
  const kind = checkKind(check.kind);
  const entry = kind.readEntry(input.record);
  if (!entry.ok) return reject("invalid", entry.message, { fields: entry.fields });
  const context = { rule: scope.decisionRule, instrumentRanges: instrument?.ranges ?? [], evidence, note: input.note };
  const judged = kind.judge(check.spec, entry.value, context);
  if (!judged.ok) return reject("invalid", judged.message, judged.fields ? { fields: judged.fields } : {});
  return { entry: entry.value, judged };
}
