import { createHash } from "node:crypto";
import type { AttachmentKind } from "@/db/schema/evidence";
import { ok, refuse, type Answer } from "@/lib/actions/answer";
import { cleanImage } from "@/lib/storage/clean-image";
import { withExtension } from "@/lib/storage/file-name";
import { FILE_LIMITS } from "@/lib/storage/limits";
import { sniff } from "@/lib/storage/sniff";
import { checkSize } from "./check-size";

/** A file as it will be kept. `clean` is undefined for scope data, whose raw bytes are kept untouched. */
export type PreparedFile = {
  kind: AttachmentKind;
  mediaType: string;
  fileName: string;
  sha256: string;
  size: number;
  width: number | null;
  height: number | null;
  clean: Buffer | undefined;
};

const sha256 = (bytes: Uint8Array) => createHash("sha256").update(bytes).digest("hex");

/** Looks at what really arrived: its kind by its content, its size, and for a picture the picture itself. */
export async function prepareFile(
  bytes: Buffer,
  name: string,
  kinds: readonly AttachmentKind[],
): Promise<Answer<PreparedFile>> {
  const content = await sniff(bytes, name);
  if (!content.ok) return content;
  if (content.value.what === "data") {
    if (!kinds.includes("scope-data"))
      return refuse("wrong-type", `${name} is a table of text; a picture is wanted here. Nothing was kept.`);
    const { type } = content.value;
    return ok({
      kind: "scope-data",
      mediaType: type,
      fileName: name,
      sha256: sha256(bytes),
      size: bytes.length,
      width: null,
      height: null,
      clean: undefined,
    });
  }

  const kind = kinds.find((one) => one !== "scope-data");
  if (!kind) return refuse("wrong-type", `${name} is a picture; scope data as text is wanted here. Nothing was kept.`);
  const fits = checkSize(name, bytes.length, [kind]);
  if (!fits.ok) return fits;
  const image = await cleanImage(bytes, content.value.type, name);
  if (!image.ok) return image;
  const { bytes: clean, mediaType, extension, width, height } = image.value;
  const fileName = withExtension(name, extension, extension === "jpg" ? ["jpeg"] : []);
  return ok({ kind, mediaType, fileName, sha256: sha256(clean), size: clean.length, width, height, clean });
}

/** Bytes that are read from the object store at most; one more shows that a file is larger than it said. */
export const READ_LIMIT = Math.max(...Object.values(FILE_LIMITS.bytes));
