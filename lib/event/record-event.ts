import type { Transaction } from "@/db/client";
import { events } from "@/db/schema/events";
import { eventPayloads, type EventKind, type EventPayload } from "./schema";

type Subject = {
  projectId: string | null;
  actorId: string | null;
  unitId?: string | undefined;
  checkId?: string | undefined;
  subjectId?: string | undefined;
};

/** One event with the payload of its kind. */
export type NewEvent = {
  [Kind in EventKind]: { subject: Subject; kind: Kind; payload: EventPayload<Kind> };
}[EventKind];

/** Writes the event row of a change; call it in the transaction of the change. The payload is checked by its schema. */
export async function recordEvent<Kind extends EventKind>(
  tx: Transaction,
  subject: Subject,
  kind: Kind,
  payload: EventPayload<Kind>,
): Promise<void> {
  await tx.insert(events).values({ ...subject, kind, payload: eventPayloads[kind].parse(payload) });
}

/** Several events of one change in one statement, in their order. */
export async function recordEvents(tx: Transaction, list: readonly NewEvent[]): Promise<void> {
  if (list.length === 0) return;
  await tx
    .insert(events)
    .values(
      list.map(({ subject, kind, payload }) => ({ ...subject, kind, payload: eventPayloads[kind].parse(payload) })),
    );
}
