import type { AttachmentKind } from "@/db/schema/evidence";
import { ACCEPT } from "@/lib/storage/limits";
import { layDown } from "./queue/file-shelf";
import type { HeldFile } from "./queue/held-attempt";

/** What may be taken for a check: what it requires first, then the rest. */
export function kindsWanted(required: readonly AttachmentKind[] | undefined): AttachmentKind[] {
  const all: AttachmentKind[] = ["photo", "scope-picture", "scope-data"];
  return [...new Set([...(required ?? []), ...all])];
}

export const acceptFor = (kinds: readonly AttachmentKind[]): string =>
  [...new Set(kinds.map((kind) => ACCEPT[kind]))].join(",");

/** What a file counts as until the server has looked at its content. */
function kindOf(file: File, kinds: readonly AttachmentKind[]): AttachmentKind {
  const picture = file.type.startsWith("image/");
  return kinds.find((kind) => (kind === "scope-data") !== picture) ?? "photo";
}

type Taken = { project: string; userId: string; checkId: string; kinds: AttachmentKind[]; files: readonly File[] };

/** Lays the files down on the device, where they survive a reload, and lets them go out in the background. */
export async function takeFiles({ project, userId, checkId, kinds, files }: Taken): Promise<void> {
  for (const file of files) {
    const held: HeldFile = {
      uploadId: crypto.randomUUID(),
      checkId,
      userId,
      fileName: file.name,
      kind: kindOf(file, kinds),
      kinds,
      file,
      attachmentId: null,
      refusal: "",
    };
    await layDown(project, held);
  }
}
