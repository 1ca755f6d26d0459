import type { findEvents } from "@/db/queries/events";
import type { CheckState } from "@/db/schema/travelers";
import type { ProjectScope } from "@/lib/access/scope";
import { loadEvidence } from "@/lib/attachment/load-evidence";
import { glyphOf } from "@/lib/event/event-group";
import { sentenceOf, severalAttached, type SentencePart } from "@/lib/event/sentence";
import type { EvidenceView } from "@/lib/traveler/traveler-view";
import type { EntryView } from "./entry-view";
import { loadEntries } from "./load-entries";
import { foldRuns } from "./fold-runs";

export type LogItem = {
  id: number;
  at: string;
  kind: string;
  sentence: SentencePart[];
  /** The state whose glyph stands before the sentence. */
  glyph: CheckState | null;
  /** The entry itself where it was written; null for everything else and for archived ones. */
  entry: EntryView | null;
  /** What was attached, as far as it is still there. */
  evidence: EvidenceView[];
};

type EventRow = Awaited<ReturnType<typeof findEvents>>[number];

/** Events as the log shows them: sentences, the entries among them, files attached in a row as one line. */
export async function logItems(scope: ProjectScope, rows: readonly EventRow[]): Promise<LogItem[]> {
  const subjects = (kind: string) => rows.flatMap((row) => (row.kind === kind && row.subjectId ? [row.subjectId] : []));
  const [entries, evidence] = await Promise.all([
    loadEntries(scope, subjects("log.written")),
    loadEvidence(scope, subjects("evidence.attached")),
  ]);
  return foldRuns(rows).map((run) => {
    const [row] = run;
    const actor = row.actorName ?? (row.actorId === null ? "Somebody who left" : "Somebody");
    const context = { ...row, project: scope.slug, actor };
    const entry = row.kind === "log.written" && row.subjectId ? entries.get(row.subjectId) : undefined;
    return {
      id: row.id,
      at: row.at.toISOString(),
      kind: row.kind,
      sentence: run.length > 1 ? severalAttached(run.length, context) : sentenceOf(row.kind, row.payload, context),
      glyph: glyphOf(row.kind, row.payload) ?? null,
      entry: entry && !entry.archivedAt ? entry : null,
      evidence: run.flatMap((one) =>
        one.kind === "evidence.attached" ? (evidence.get(one.subjectId ?? "") ?? []) : [],
      ),
    };
  });
}
