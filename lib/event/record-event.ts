import type { Transaction } from "@/db/client";
import { events } from "@/db/schema/events";
import { eventPayloads, type EventKind, type EventPayload } from "./schema";

type Subject = { projectId: string | null; actorId: string | null; unitId?: string; checkId?: string; subjectId?: string };

/** Writes the event row of a change; call it in the transaction of the change. The payload is checked by its schema. */
export async function recordEvent<Kind extends EventKind>(
  tx: Transaction,
  subject: Subject,
  kind: Kind,
  payload: EventPayload<Kind>,
): Promise<void> {
  await tx.insert(events).values({ ...subject, kind, payload: eventPayloads[kind].parse(payload) });
}
