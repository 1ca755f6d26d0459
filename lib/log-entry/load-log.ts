import { asc, and, eq, isNull } from "drizzle-orm";
import { database } from "@/db/client";
import { findActors, findEvents, type EventFilter } from "@/db/queries/events";
import { units } from "@/db/schema/boards";
import type { ProjectScope } from "@/lib/access/scope";
import { kindsOf, type EventGroup } from "@/lib/event/event-group";
import type { PersonView } from "@/lib/traveler/traveler-view";
import { logItems, type LogItem } from "./log-items";

export type { LogItem } from "./log-items";

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
  const items = await logItems(scope, page);
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
    // In the whole stream the entry itself shows its pictures.
    withoutEntryPictures: show === undefined,
    unit,
    actorId: by,
    before,
  };
}
