import { inArray } from "drizzle-orm";
import type { Transaction } from "@/db/client";
import type { CheckRow, findOwnInstrument } from "@/db/queries/checks";
import { attachments } from "@/db/schema/evidence";
import { attempts, readings } from "@/db/schema/travelers";
import type { ProjectScope } from "@/lib/access/scope";
import type { Judged, JudgedReading } from "@/lib/check-kinds/kind";
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
  const attempt = tx.$with("attempt").as(
    tx
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
      .returning({ arrival: attempts.arrival, recordedAt: attempts.recordedAt }),
  );
  // One statement for the attempt and its readings: fewer round trips while the unit's traveler is locked.
  const rows = await (judged.readings.length === 0
    ? tx.with(attempt).select().from(attempt)
    : tx
        .with(attempt, newReadings(tx, input.id, judged.readings))
        .select()
        .from(attempt));
  const [inserted] = rows;
  if (!inserted) throw new Error("inserting an attempt returned no row");
  await tieEvidence(tx, input, check);
  return { ...inserted, sentences };
}

function newReadings(tx: Transaction, attemptId: string, judged: readonly JudgedReading[]) {
  const rows = judged.map((reading, position) => ({ ...reading, position, attemptId }));
  return tx.$with("reading").as(tx.insert(readings).values(rows).returning({ id: readings.id }));
}

async function tieEvidence(tx: Transaction, input: RecordAttemptInput, check: CheckRow): Promise<void> {
  if (input.attachmentIds.length === 0) return;
  await tx
    .update(attachments)
    .set({ attemptId: input.id, checkId: check.id, unitId: check.unitId })
    .where(inArray(attachments.id, input.attachmentIds));
}
