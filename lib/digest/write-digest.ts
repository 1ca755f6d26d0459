import type { DigestMailProps, EntryLine } from "@/emails/parts/digest-mail-props";
import { appLink } from "@/lib/mail/app-link";
import type { Message } from "@/lib/mail/message";
import { writeDay } from "@/lib/mail/write-day";
import { outlookSentence } from "./outlook-sentence";
import { boardLines } from "./board-lines";
import type { createPictures, MailPicture } from "./digest-pictures";
import { plainExcerpt } from "./plain-excerpt";
import { partOf, type EntryRow, type ProjectWeek, type Span } from "./project-week";
import { nextItems, openItems, standingSentence } from "./standing-lists";
import { summarise } from "./summary";
import { attemptsOf, cut, failedItems, passedLines } from "./week-attempts";
import { alsoSentences, decidedItems } from "./week-decisions";
import { wiringLines } from "./wiring-lines";

const MOST_ENTRIES = 4;
const MOST_PICTURES = 3;

type Pictures = ReturnType<typeof createPictures>;
export type Digest = Omit<DigestMailProps, "unsubscribeLink"> & { inline: NonNullable<Message["inline"]> };

/** The digest of one span as somebody in this zone reads it; nothing in it is personal but the way of writing days. */
export async function writeDigest(week: ProjectWeek, span: Span, zone: string, pictures: Pictures): Promise<Digest> {
  const { slug, name } = week.project;
  const reader = { project: slug, zone };
  const { events, entries } = partOf(week, span);
  const attempts = attemptsOf(events);
  const decided = decidedItems(events, reader);
  const also = alsoSentences(events, reader);
  const wiring = wiringLines(week, span);
  const written = await entryLines(entries, reader, pictures);
  const home = `/projects/${encodeURIComponent(slug)}`;
  return {
    projectName: name,
    projectLink: appLink(`${home}/rack`),
    logLink: appLink(`${home}/log`),
    period: `${writeDay(span.since, zone)} to ${writeDay(span.until, zone)}`,
    ...summarise({ attempts, events }, written.total, also.sentences.length + (wiring?.fresh.length ?? 0)),
    standing: standingSentence(week),
    outlook: outlookSentence(week, span, zone),
    boards: boardLines(week),
    passed: passedLines(attempts, reader),
    failed: failedItems(attempts, reader),
    decided,
    entries: { lines: written.lines, more: written.total - written.lines.length },
    also,
    open: openItems(week, zone),
    next: nextItems(week),
    wiring,
    settingsLink: appLink("/settings/digest"),
    inline: written.inline,
  };
}

async function entryLines(
  rows: readonly EntryRow[],
  { project, zone }: { project: string; zone: string },
  pictures: Pictures,
) {
  const byEntry = new Map<string, EntryRow[]>();
  for (const row of rows) byEntry.set(row.id, [...(byEntry.get(row.id) ?? []), row]);
  const newest = cut([...byEntry.values()].reverse(), MOST_ENTRIES).items;
  const chosen = await choosePictures(newest, pictures);
  const lines = newest.flatMap(([entry]): EntryLine[] => {
    if (!entry) return [];
    const own = chosen.filter((one) => one.entryId === entry.id).map((one) => one.picture.shown);
    return [
      {
        title: entry.title,
        link: appLink(`/projects/${encodeURIComponent(project)}/log/${entry.id}`),
        by: `${entry.author ?? "Somebody"}, ${writeDay(entry.createdAt, zone)}`,
        excerpt: plainExcerpt(entry.body),
        pictures: own,
      },
    ];
  });
  return { lines, total: byEntry.size, inline: chosen.map((one) => one.picture.inline) };
}

/** The first picture of each entry, then the second of each, until there are three. */
async function choosePictures(entries: readonly EntryRow[][], pictures: Pictures) {
  const deepest = Math.max(0, ...entries.map((rows) => rows.length));
  const order = Array.from({ length: deepest }, (_, depth) => entries.flatMap((rows) => rows[depth] ?? [])).flat();
  const chosen: { entryId: string; picture: MailPicture }[] = [];
  for (const { id, picture } of order) {
    if (chosen.length === MOST_PICTURES) break;
    const made = picture && (await pictures(picture));
    if (made) chosen.push({ entryId: id, picture: made });
  }
  return chosen;
}
