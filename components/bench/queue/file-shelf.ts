import { deviceDatabase } from "./device-database";
import type { HeldFile } from "./held-attempt";
import { uploadHeldFile } from "./upload-held-file";

/**
 * The files taken for checks that are not recorded yet. They lie on the device first and are uploaded in the
 * background; what has not arrived when the attempt is recorded goes with it.
 */
const NONE: readonly HeldFile[] = [];
const shelves = new Map<string, readonly HeldFile[]>();
const watchers = new Set<() => void>();
const loading = new Set<string>();

function show(checkId: string, files: readonly HeldFile[]) {
  shelves.set(checkId, files);
  for (const watch of watchers) watch();
}

async function look(checkId: string) {
  show(checkId, await (await deviceDatabase()).getAllFromIndex("files", "checkId", checkId));
}

export function watchFiles(watch: () => void): () => void {
  watchers.add(watch);
  return () => void watchers.delete(watch);
}

/** The files of a check as far as they are known; reading them from the device begins with the first call. */
export function filesOf(checkId: string): readonly HeldFile[] {
  if (!shelves.has(checkId) && !loading.has(checkId)) {
    loading.add(checkId);
    void look(checkId).catch(() => undefined);
  }
  return shelves.get(checkId) ?? NONE;
}

async function put(file: HeldFile) {
  await (await deviceDatabase()).put("files", file);
  await look(file.checkId);
}

/** Sends one in the background. What cannot go now stays and goes with the attempt. */
async function send(project: string, held: HeldFile) {
  const result = await uploadHeldFile(project, held);
  const stillThere = await (await deviceDatabase()).getKey("files", held.uploadId);
  if (stillThere === undefined) return;
  if (result.ok) await put({ ...held, attachmentId: result.attachmentId, file: null });
  else if (!result.retry) await put({ ...held, refusal: result.message });
}

/** Lays a file down on the device; when this returns it survives a reload. */
export async function layDown(project: string, held: HeldFile): Promise<void> {
  await put(held);
  void send(project, held).catch(() => undefined);
}

/** Takes files back from the shelf: they went with an attempt, or the person wants them away. */
export async function clearFiles(checkId: string, uploadIds: readonly string[]): Promise<void> {
  const db = await deviceDatabase();
  await Promise.all(uploadIds.map((uploadId) => db.delete("files", uploadId)));
  await look(checkId);
}

/** Puts the files of an attempt that was taken back on the shelf again. */
export async function putBack(files: readonly HeldFile[]): Promise<void> {
  for (const file of files) await put(file);
}
