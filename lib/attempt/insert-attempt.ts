import { inArray } from "drizzle-orm";
import type { Transaction } from "@/db/client";
import type { CheckRow, findOwnInstrument } from "@/db/queries/checks";
import { attachments } from "@/db/schema/evidence";
import { attempts, readings } from "@/db/schema/travelers";
import type { ProjectScope } from "@/lib/access/scope";
import type { Judged } from "@/lib/check-kinds/kind";
import { performedAt } from "./performed-at";
import type { RecordAttemptInput } from "./schema";

type Recording = {
  input: RecordAttemptInput;
  check: CheckRow;
  instrument: Awaited<ReturnType<typeof findOwnInstrument>>;
  entry: unknown;
  judged: Extract<Judged, { ok: true }>;
};

/** The rows of one attempt: itself, its readings, and its evidence tied to it. */
export async function insertAttempt(tx: Transaction, scope: ProjectScope, recording: Recording) {
  const { input, check, instrument, entry, judged } = recording;
  const performed = performedAt(input.performedAt, new Date());
  const sentences = performed.sentence ? [...judged.sentences, performed.sentence] : judged.sentences;
  const [inserted] = await tx
    .insert(attempts)
    .values({
      id: input.id,
      projectId: scope.projectId,
      unitId: check.unitId,
      checkId: check.id,
      procedureCheckId: check.procedureCheckId,
      userId: scope.viewer.userId,
      performedAt: performed.at,
      verdict: judged.verdict,
      record: entry,
      sentences,
      note: input.note,
      instrumentId: instrument?.id ?? null,
      instrumentSnapshot: instrument
        ? { name: instrument.name, ranges: instrument.ranges, calibrationNote: instrument.calibrationNote }
        : null,
    })
    .returning({ arrival: attempts.arrival, recordedAt: attempts.recordedAt });
  if (!inserted) throw new Error("inserting an attempt returned no row");
  if (judged.readings.length > 0) {
    await tx
      .insert(readings)
      .values(judged.readings.map((reading, position) => ({ ...reading, position, attemptId: input.id })));
  }
  if (input.attachmentIds.length > 0) {
    await tx
      .update(attachments)
      .set({ attemptId: input.id, checkId: check.id, unitId: check.unitId })
      .where(inArray(attachments.id, input.attachmentIds));
  }
  return { ...inserted, sentences };
}
