import { and, eq } from "drizzle-orm";
import { instruments } from "@/db/schema/people";
import type { OwnScope } from "@/lib/access/scope";
import { reject, type Answer } from "@/lib/actions/answer";
import { change } from "@/lib/event/change";
import type { SaveInstrumentInput } from "./schema";

/** Keeps an instrument of the person. Readings taken with it earlier keep the uncertainty that they were judged with. */
export async function saveInstrument(scope: OwnScope, input: SaveInstrumentInput): Promise<Answer<{ id: string }>> {
  const { userId } = scope.viewer;
  const { writeId, instrument, ...values } = input;
  return change({ writeId, userId, action: "save-instrument" }, async (tx) => {
    const [row] = instrument
      ? await tx
          .update(instruments)
          .set(values)
          .where(and(eq(instruments.id, instrument), eq(instruments.userId, userId)))
          .returning({ id: instruments.id })
      : await tx
          .insert(instruments)
          .values({ ...values, userId })
          .returning({ id: instruments.id });
    return row ?? reject("not-found", "You have no such instrument.");
  });
}
