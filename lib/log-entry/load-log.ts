import { asc, and, eq, isNull } from "drizzle-orm";
import { database } from "@/db/client";
import { findActors, findEvents, type EventFilter } from "@/db/queries/events";
import { units } from "@/db/schema/boards";
import type { CheckState } from "@/db/schema/travelers";
import type { ProjectScope } from "@/lib/access/scope";
import { loadEvidence } from "@/lib/attachment/load-evidence";
import { glyphOf, kindsOf, type EventGroup } from "@/lib/event/event-group";
import { sentenceOf, type SentencePart } from "@/lib/event/sentence";
import type { EvidenceView, PersonView } from "@/lib/traveler/traveler-view";
import type { EntryView } from "./entry-view";
import { loadEntries } from "./load-entries";

export type LogItem = {
  id: number;
  at: string;
  kind: string;
  sentence: SentencePart[];
  /** The state whose glyph stands before the sentence. */
  glyph: CheckState | null;
  /** The entry itself where it was written; null for everything else and for archived ones. */
  entry: EntryView | null;
  /** The picture or data that was attached, while it is there. */
  evidence: EvidenceView | null;
};

export type LogQuery = {
  show: EventGroup | undefined;
  unit: string | undefined;
  by: string | undefined;
  before: number | undefined;
};

export type LogView = {
  items: LogItem[];
  /** Where the next, older page begins; null at the beginning of the project. */
  older: number | null;
  people: PersonView[];
  units: string[];
};

const PAGE_SIZE = 50;

/** One page of everything that happened, newest first, entries in their place among it. */
export async function loadLog(scope: ProjectScope, query: LogQuery): Promise<LogView> {
  const db = database();
  const [rows, people, serials] = await Promise.all([
    findEvents(db, scope, filterOf(query), PAGE_SIZE + 1),
    findActors(db, scope),
    db
      .select({ serial: units.serial })
      .from(units)
      .where(and(eq(units.projectId, scope.projectId), isNull(units.archivedAt)))
      .orderBy(asc(units.serial)),
  ]);
  const page = rows.slice(0, PAGE_SIZE);
  const subjects = (kind: string) => page.flatMap((row) => (row.kind === kind && row.subjectId ? [row.subjectId] : []));
  const [entries, evidence] = await Promise.all([
    loadEntries(scope, subjects("log.written")),
    loadEvidence(scope, subjects("evidence.attached")),
  ]);

  const items = page.map((row): LogItem => {
    const actor = row.actorName ?? (row.actorId === null ? "Somebody who left" : "Somebody");
    const entry = row.kind === "log.written" && row.subjectId ? entries.get(row.subjectId) : undefined;
    const attached = row.kind === "evidence.attached" && row.subjectId ? evidence.get(row.subjectId) : undefined;
    return {
      id: row.id,
      at: row.at.toISOString(),
      kind: row.kind,
      sentence: sentenceOf(row.kind, row.payload, { ...row, project: scope.slug, actor }),
      glyph: glyphOf(row.kind, row.payload) ?? null,
      entry: entry && !entry.archivedAt ? entry : null,
      evidence: attached ?? null,
    };
  });
  return {
    items,
    older: rows.length > PAGE_SIZE ? (page.at(-1)?.id ?? null) : null,
    people: people.map(({ id, name }) => ({ id, name: name ?? "Somebody" })),
    units: serials.map((row) => row.serial),
  };
}

function filterOf({ show, unit, by, before }: LogQuery): EventFilter {
  return {
    kinds: show && kindsOf(show),
    onlyFailures: show === "failures",
    unit,
    actorId: by,
    before,
  };
}
