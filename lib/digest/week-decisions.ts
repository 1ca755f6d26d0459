import type { DigestItem, DigestList } from "@/emails/parts/digest-mail-props";
import type { DigestEvent } from "@/db/queries/digest-week";
import { eventPayloads } from "@/lib/event/schema";
import { plainSentence, sentenceOf } from "@/lib/event/sentence";
import { appLink } from "@/lib/mail/app-link";
import { writeDay } from "@/lib/mail/write-day";
import { cut, linkTo, quoted, type Reader } from "./week-attempts";

const MOST_DECISIONS = 6;
const MOST_OTHERS = 6;

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
    // A doubt comes from the program and says itself what it is about; a decision has its maintainer's words.
    const detail =
      verb === "" ? `${reason} ${day}.` : `${event.actorName ?? "Somebody"} ${verb}, ${day}. ${quoted(reason)}`;
    return [{ mark, serial, title, link: linkTo(event, serial, reader), detail: detail.trim() }];
  });
  return cut(items.reverse(), MOST_DECISIONS);
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
  "finding.accepted",
  "finding.acceptance-withdrawn",
];

/** Other steps of the project, each as the log's own sentence. */
export function alsoSentences(events: readonly DigestEvent[], { project }: Reader) {
  const sentences = events.flatMap((event) => {
    if (!ALSO.includes(event.kind)) return [];
    const parts = sentenceOf(event.kind, event.payload, { ...event, project, actor: event.actorName ?? "Somebody" });
    const href = parts.find((part) => part.href)?.href ?? `/projects/${project}/log`;
    return [{ text: plainSentence(parts), link: appLink(href) }];
  });
  const { items, more } = cut(sentences.reverse(), MOST_OTHERS);
  return { sentences: items, more };
}
