import type { DigestItem, DigestList, PassedLine } from "@/emails/parts/digest-mail-props";
import type { DigestEvent } from "@/db/queries/digests";
import { eventPayloads, type EventPayload } from "@/lib/event/schema";
import { plainSentence, sentenceOf } from "@/lib/event/sentence";
import { appLink, checkLink } from "@/lib/mail/app-link";
import { writeDay } from "@/lib/mail/write-day";

/** A mail is read on a phone between two other things; the rest is one press away. */
const MOST = { items: 8, passedUnits: 12, titles: 4, also: 6 };

type Reader = { project: string; zone: string };
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

const linkTo = (event: DigestEvent, serial: string, { project }: Reader) =>
  event.checkId ? checkLink(project, event.unitSerial ?? serial, event.checkId) : appLink(`/projects/${project}/log`);

/** Passes by unit, the most first. */
export function passedLines(attempts: readonly Attempt[], reader: Reader): { lines: PassedLine[]; more: number } {
  const units = new Map<string, Attempt[]>();
  for (const attempt of attempts) {
    if (attempt.verdict === "does-not-conform") continue;
    units.set(attempt.serial, [...(units.get(attempt.serial) ?? []), attempt]);
  }
  const lines = [...units].map(([serial, list]) => {
    const first = list.filter((attempt) => attempt.firstPass);
    const links = new Map(
      list.map((one) => [one.title, { title: one.title, link: linkTo(one.event, serial, reader) }]),
    );
    const { items: checks, more } = cut([...links.values()], MOST.titles);
    const link = appLink(`/projects/${encodeURIComponent(reader.project)}/units/${encodeURIComponent(serial)}`);
    return {
      serial,
      link,
      counts: passCounts(first.length, list.length - first.length),
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

export function passCounts(first: number, repeats: number): string {
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
    const who = `${event.actorName ?? "Somebody"}, ${writeDay(event.at, reader.zone)}`;
    const often = times(key) > 1 ? ` Failed ${times(key)} times.` : "";
    return {
      mark: "failed",
      serial,
      title,
      link: linkTo(event, serial, reader),
      detail: `${readingOf(reading)}${who}.${often}`,
    };
  });
  return cut(items.reverse(), MOST.items);
}

/** A statement has no reading; the words of the verdict say nothing that the heading does not. */
export const readingOf = (reading: string) => (reading === "" || reading === "does not conform" ? "" : `${reading}. `);

const DECISIONS = {
  "check.reopened": { mark: "reopened", verb: "reopened it" },
  "check.doubted": { mark: "doubtful", verb: "" },
  "concession.granted": { mark: "conceded", verb: "granted a concession" },
  "concession.withdrawn": { mark: "failed", verb: "withdrew the concession" },
  "hold.lifted": { mark: "conceded", verb: "lifted the hold point for this unit" },
} as const;

const isDecision = (kind: string): kind is keyof typeof DECISIONS => Object.hasOwn(DECISIONS, kind);

/** What was reopened, conceded, lifted or put in doubt, with the reason and who decided, newest first. */
export function decidedItems(events: readonly DigestEvent[], reader: Reader): DigestList {
  const items = events.flatMap((event): DigestItem[] => {
    if (!isDecision(event.kind)) return [];
    const payload = eventPayloads[event.kind].safeParse(event.payload);
    if (!payload.success) return [];
    const { serial, title, reason } = payload.data;
    const { mark, verb } = DECISIONS[event.kind];
    const day = writeDay(event.at, reader.zone);
    const who = verb === "" ? `In doubt since ${day}.` : `${event.actorName ?? "Somebody"} ${verb}, ${day}.`;
    const why = reason === "" ? "" : ` “${reason}”`;
    return [{ mark, serial, title, link: linkTo(event, serial, reader), detail: `${who}${why}` }];
  });
  return cut(items.reverse(), MOST.items);
}

const ALSO = [
  "procedure.issued",
  "revision.released",
  "board.created",
  "unit.created",
  "unit.placed",
  "traveler.started",
  "traveler.moved",
  "member.joined",
];

/** Other steps of the project, each as the log's own sentence. */
export function alsoSentences(events: readonly DigestEvent[], { project }: Reader) {
  const sentences = events.flatMap((event) => {
    if (!ALSO.includes(event.kind)) return [];
    const parts = sentenceOf(event.kind, event.payload, { ...event, project, actor: event.actorName ?? "Somebody" });
    const href = parts.find((part) => part.href)?.href ?? `/projects/${project}/log`;
    return [{ text: plainSentence(parts), link: appLink(href) }];
  });
  const { items, more } = cut(sentences.reverse(), MOST.also);
  return { sentences: items, more };
}
