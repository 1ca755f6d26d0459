import sharp from "sharp";
import type { DigestPicture } from "@/emails/parts/digest-mail-props";
import { log } from "@/lib/http/log";
import type { Message } from "@/lib/mail/message";
import { FILE_LIMITS } from "@/lib/storage/limits";
import { readWhole } from "@/lib/storage/object-store";
import type { EntryRow } from "./project-week";

type Source = NonNullable<EntryRow["picture"]>;
type Inline = NonNullable<Message["inline"]>[number];
export type MailPicture = { shown: DigestPicture; inline: Inline };

/** Together the three stay well under what a mail reader loads without asking. */
const MOST_BYTES = 50_000;
const SIDE = 360;
const READ_LIMIT = 8_000_000;

/**
 * Makes the small pictures of a mail, each once for all its readers. A picture that cannot be had (the object store is
 * away, no thumbnail yet and the original is big) is left out: the words go out without it.
 */
export function createPictures() {
  const made = new Map<string, Promise<MailPicture | undefined>>();
  return (source: Source): Promise<MailPicture | undefined> => {
    const known = made.get(source.id) ?? make(source);
    made.set(source.id, known);
    return known;
  };
}

async function make({ id, caption, fileName, smallKey, objectKey }: Source): Promise<MailPicture | undefined> {
  try {
    const bytes = await readWhole(smallKey ?? objectKey, READ_LIMIT);
    if (!bytes) return undefined;
    const { data, info } = await jpeg(bytes);
    const contentId = `picture-${id}`;
    return {
      shown: { contentId, caption: caption === "" ? fileName : caption, width: info.width, height: info.height },
      inline: { contentId, fileName: `${id}.jpg`, mediaType: "image/jpeg", content: data },
    };
  } catch (error) {
    log().warn({ attachmentId: id, err: error }, "a picture is left out of a digest");
    return undefined;
  }
}

/** JPEG, since some mail readers show nothing else; on white where a drawing is transparent. */
async function jpeg(bytes: Buffer) {
  const at = (quality: number) =>
    sharp(bytes, { limitInputPixels: FILE_LIMITS.pixels })
      .resize({ width: SIDE, height: SIDE, fit: "inside", withoutEnlargement: true })
      .flatten({ background: "#fffdf8" })
      .jpeg({ quality, mozjpeg: true })
      .timeout({ seconds: 20 })
      .toBuffer({ resolveWithObject: true });
  const good = await at(74);
  return good.data.length <= MOST_BYTES ? good : at(40);
}
