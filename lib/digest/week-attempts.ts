import type { DigestItem, DigestList, Mark, PassedLine } from "@/emails/parts/digest-mail-props";
import type { DigestEvent } from "@/db/queries/digest-week";
import { eventPayloads, type EventPayload } from "@/lib/event/schema";
import { appLink, checkLink } from "@/lib/mail/app-link";
import { writeDay } from "@/lib/mail/write-day";

/** A mail is read on a phone between two other things; the rest is one press away. */
const MOST = { items: 6, passedUnits: 7, titles: 3 };

export type Reader = { project: string; zone: string };
type Attempt = EventPayload<"attempt.recorded"> & { event: DigestEvent };

export function cut<Item>(items: readonly Item[], most: number): { items: Item[]; more: number } {
  // One more line takes no more room than "and 1 more".
  const shown = items.length === most + 1 ? items.length : most;
  return { items: items.slice(0, shown), more: Math.max(0, items.length - shown) };
}

/** Attempts that still count: those that were voided in the same week are as if they had not been made. */
export function attemptsOf(events: readonly DigestEvent[]): Attempt[] {
  const voided = new Set(events.filter((event) => event.kind === "attempt.voided").map((event) => event.subjectId));
  return events.flatMap((event) => {
    if (event.kind !== "attempt.recorded" || voided.has(event.subjectId)) return [];
    const payload = eventPayloads["attempt.recorded"].safeParse(event.payload);
    return payload.success ? [{ ...payload.data, event }] : [];
  });
}

export const linkTo = (event: DigestEvent, serial: string, { project }: Reader) =>
  event.checkId ? checkLink(project, event.unitSerial ?? serial, event.checkId) : appLink(`/projects/${project}/log`);

/** Passes by unit, the most first. */
export function passedLines(attempts: readonly Attempt[], reader: Reader): { lines: PassedLine[]; more: number } {
  const units = new Map<string, Attempt[]>();
  for (const attempt of attempts) {
    if (attempt.verdict === "does-not-conform") continue;
    units.set(attempt.serial, [...(units.get(attempt.serial) ?? []), attempt]);
  }
  const lines = [...units].map(([serial, list]) => {
    const links = new Map(
      list.map((one) => [one.title, { title: one.title, link: linkTo(one.event, serial, reader) }]),
    );
    const { items: checks, more } = cut([...links.values()], MOST.titles);
    const link = appLink(`/projects/${encodeURIComponent(reader.project)}/units/${encodeURIComponent(serial)}`);
    return {
      serial,
      link,
      counts: passCounts(countPasses(list)),
      checks,
      more,
      total: list.length,
    };
  });
  const { items, more } = cut(
    lines.sort((a, b) => b.total - a.total || a.serial.localeCompare(b.serial, "en")),
    MOST.passedUnits,
  );
  return { lines: items, more };
}

export type Passes = { checks: number; first: number; repeats: number };

/** Counts checks, not attempts: what passed three times on one evening is one check. */
export function countPasses(attempts: readonly Attempt[]): Passes {
  const passes = attempts.filter((attempt) => attempt.verdict !== "does-not-conform");
  const key = ({ event }: Attempt) => event.checkId ?? event.subjectId;
  const checks = new Set(passes.map(key)).size;
  const first = new Set(passes.filter((attempt) => attempt.firstPass).map(key)).size;
  return { checks, first, repeats: checks - first };
}

export function passCounts({ first, repeats }: Passes): string {
  const parts = [first > 0 ? `${first} for the first time` : "", repeats > 0 ? `${repeats} on repeat` : ""];
  return parts.filter((part) => part !== "").join(", ");
}

export function failedItems(attempts: readonly Attempt[], reader: Reader): DigestList {
  const failed = attempts.filter((attempt) => attempt.verdict === "does-not-conform");
  // A check that failed several times is one line, with its last reading.
  const last = new Map(failed.map((attempt) => [attempt.event.checkId ?? attempt.event.subjectId, attempt]));
  const times = (key: string | null) =>
    failed.filter((one) => (one.event.checkId ?? one.event.subjectId) === key).length;
  const items = [...last].map(([key, { serial, title, reading, event }]): DigestItem => {
    const who = `${event.actorName ?? "Somebody"}, ${writeDay(event.at, reader.zone)}.`;
    const often = times(key) > 1 ? `Failed ${times(key)} times.` : "";
    const detail = [readingOf(reading), quoted(event.note), who, often].filter((part) => part !== "").join(" ");
    return { mark: markOf(event.state), serial, title, link: linkTo(event, serial, reader), detail };
  });
  return cut(items.reverse(), MOST.items);
}

/** A statement has no reading; the words of the verdict say nothing that the heading does not. */
export const readingOf = (reading: string) => (reading === "" || reading === "does not conform" ? "" : `${reading}.`);

const MOST_CHARACTERS = 240;

/** What somebody wrote, in their words; a long text by its beginning. */
export function quoted(text: string | null): string {
  if (!text) return "";
  return `“${text.length > MOST_CHARACTERS ? `${text.slice(0, MOST_CHARACTERS).trimEnd()}…` : text}”`;
}

const NOW: Record<string, Mark> = {
  failed: "failed",
  reopened: "reopened",
  doubtful: "doubtful",
  conceded: "conceded",
  passed: "passed",
};

/** How the check stands now: what failed on Monday may have passed on Wednesday. */
export const markOf = (state: string | null): Mark => NOW[state ?? "failed"] ?? "free";
