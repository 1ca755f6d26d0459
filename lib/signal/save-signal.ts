import { eq } from "drizzle-orm";
import type { Transaction } from "@/db/client";
import { findCaseTwins, findClaims, lockSignal } from "@/db/queries/signals";
import { signals } from "@/db/schema/wiring";
import type { ProjectScope } from "@/lib/access/scope";
import { reject, type Answer } from "@/lib/actions/answer";
import { change } from "@/lib/event/change";
import { recordEvent } from "@/lib/event/record-event";
import { refreshFindings } from "@/lib/machine/refresh-findings";
import type { SaveSignalInput } from "./schema";
import { writeFrequency } from "./write-frequency";

/** What is known of a signal beyond its pins: class, other names, how often it moves. Checked anew at once. */
export async function saveSignal(scope: ProjectScope, input: SaveSignalInput): Promise<Answer<{ version: number }>> {
  const { projectId, viewer } = scope;
  const { name, aliases, frequency: frequencyHz, note } = input;
  return change({ writeId: input.writeId, userId: viewer.userId, action: "save-signal" }, async (tx) => {
    const current = await lockSignal(tx, scope, name);
    if ((current?.version ?? 0) !== input.version) rejectStale(name, current);
    if (!current) await rejectCaseTwin(tx, scope, name);
    await rejectTakenName(tx, scope, name);
    const values = { class: input.class, aliases, frequencyHz, note, version: input.version + 1 };
    const [row] = current
      ? await tx.update(signals).set(values).where(eq(signals.id, current.id)).returning({ id: signals.id })
      : await tx
          .insert(signals)
          .values({ projectId, name, ...values })
          .onConflictDoNothing()
          .returning({ id: signals.id });
    if (!row) return rejectStale(name, await lockSignal(tx, scope, name));
    await recordEvent(tx, { projectId, actorId: viewer.userId, subjectId: row.id }, "signal.saved", { name });
    await refreshFindings(tx, scope);
    return { version: values.version };
  });
}

export function rejectStale(name: string, current: Awaited<ReturnType<typeof lockSignal>>): never {
  if (!current) {
    return reject("conflict", `Somebody took away meanwhile what was said of ${name}. Save again to say it anew.`, {
      details: { current: { class: "data", aliases: "", frequency: "", note: "", version: 0 } },
    });
  }
  const { aliases, frequencyHz, note, version } = current;
  const frequency = writeFrequency(frequencyHz);
  return reject("conflict", `Somebody changed ${name} meanwhile. Look at both and save again.`, {
    details: { current: { class: current.class, aliases: aliases.join(", "), frequency, note, version } },
  });
}

async function rejectCaseTwin(tx: Transaction, scope: ProjectScope, name: string) {
  const [twin] = await findCaseTwins(tx, scope, name);
  if (!twin) return;
  const sentence = twin.carried
    ? `The pins carry ${twin.name}, which differs from ${name} only in case. Write it as the pins do.`
    : `There is ${twin.name} already, which differs from ${name} only in case. Change that one.`;
  reject("invalid", sentence, { fields: { name: sentence } });
}

/**
 * A name that stands for another signal is not free. Two signals may share another name: a card that sits in three slots
 * calls each slot's own select SEL_N.
 */
async function rejectTakenName(tx: Transaction, scope: ProjectScope, name: string) {
  const [claim] = await findClaims(tx, scope, name);
  if (!claim) return;
  const sentence = `${name} is another name of ${claim.name} already. Take it away there first.`;
  reject("invalid", sentence, { fields: { name: sentence } });
}
