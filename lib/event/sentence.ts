import { phrases, type SentenceContext, type SentencePart } from "./phrases";
import { eventPayloads, type EventKind, type EventPayload } from "./schema";
import { WRITERS } from "./sentences/list";

export type { SentenceContext, SentencePart } from "./phrases";

/** The sentence of one event. A payload that no schema knows (an older form) still gets a true one. */
export function sentenceOf(kind: string, payload: unknown, context: SentenceContext): SentencePart[] {
  const parts = isEventKind(kind) ? write(kind, payload, context) : undefined;
  return (parts ?? [context.actor, " changed something."]).map((part) =>
    typeof part === "string" ? { text: part } : part,
  );
}

function write<Kind extends EventKind>(kind: Kind, payload: unknown, context: SentenceContext) {
  const parsed = eventPayloads[kind].safeParse(payload);
  // The schema of this kind has just read it; the compiler cannot follow the correlation of kind and payload.
  return parsed.success ? WRITERS[kind](parsed.data as EventPayload<Kind>, phrases(context)) : undefined;
}

/** One sentence for several files that one person attached to one place in a row. */
export function severalAttached(files: number, context: SentenceContext): SentencePart[] {
  const { who, place } = phrases(context);
  const parts = [who, ` attached ${files} files`, ...place(" to "), "."];
  return parts.map((part) => (typeof part === "string" ? { text: part } : part));
}

function isEventKind(kind: string): kind is EventKind {
  return Object.hasOwn(eventPayloads, kind);
}

/** Without links, for mail text and titles. */
export const plainSentence = (parts: readonly SentencePart[]): string => parts.map((part) => part.text).join("");
