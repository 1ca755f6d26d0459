import { and, eq, isNull } from "drizzle-orm";
import sharp from "sharp";
import { database } from "@/db/client";
import { attachments } from "@/db/schema/evidence";
import { deleteObjects, putObject, readWhole } from "@/lib/storage/object-store";
import { FILE_LIMITS } from "@/lib/storage/limits";
import { READ_LIMIT } from "./prepare-file";

/**
 * Makes both thumbnails of a picture. May run twice, also at the same time: the first to write its keys wins and the
 * other one's objects go. Throws when the object store does not answer; the queue tries again.
 */
export async function makeThumbnails({ attachmentId }: { attachmentId: string }): Promise<void> {
  const db = database();
  const [row] = await db.select().from(attachments).where(eq(attachments.id, attachmentId)).limit(1);
  if (!row || row.kind === "scope-data" || row.smallKey !== null) return;
  const original = await readWhole(row.objectKey, READ_LIMIT);
  if (!original) throw new Error(`the object of attachment ${attachmentId} cannot be read`);

  const made: string[] = [];
  try {
    const { small, large } = FILE_LIMITS.thumbnails;
    made.push(await putObject(await shrink(original, small), `${attachmentId}-small.webp`, "image/webp"));
    made.push(await putObject(await shrink(original, large), `${attachmentId}-large.webp`, "image/webp"));
    const [smallKey, largeKey] = made;
    const written = await db
      .update(attachments)
      .set({ smallKey, largeKey })
      .where(and(eq(attachments.id, attachmentId), isNull(attachments.smallKey)))
      .returning({ id: attachments.id });
    if (written.length === 0) await deleteObjects(made);
  } catch (error) {
    await deleteObjects(made).catch(() => undefined);
    throw error;
  }
}

/** Never enlarges: a small scope picture stays sharp. */
function shrink(original: Buffer, side: number): Promise<Buffer> {
  return sharp(original, { limitInputPixels: FILE_LIMITS.pixels, sequentialRead: true })
    .resize({ width: side, height: side, fit: "inside", withoutEnlargement: true })
    .webp({ quality: 80 })
    .timeout({ seconds: 60 })
    .toBuffer();
}
