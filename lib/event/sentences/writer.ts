import type { Phrases, SentencePart } from "../phrases";
import type { EventKind, EventPayload } from "../schema";

export type Writer<Kind extends EventKind> = (payload: EventPayload<Kind>, says: Phrases) => (string | SentencePart)[];

/** One writer for each kind of event whose name begins with one of the subjects; a kind without one does not compile. */
export type Writers<Subject extends string> = {
  [Kind in EventKind as Kind extends `${Subject}.${string}` ? Kind : never]: Writer<Kind>;
};
