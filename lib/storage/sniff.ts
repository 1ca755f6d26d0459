import { fileTypeFromBuffer } from "file-type";
import { ok, refuse, type Answer } from "@/lib/actions/answer";
import { delimiterOf, hasUtf16Mark, textHead } from "./delimited-text";
import { extensionOf } from "./file-name";

export type PictureType = "image/jpeg" | "image/png" | "image/webp" | "image/gif" | "image/tiff";
export type Content =
  { what: "picture"; type: PictureType } | { what: "data"; type: "text/csv" | "text/tab-separated-values" };

const PICTURES: ReadonlySet<string> = new Set<PictureType>([
  "image/jpeg",
  "image/png",
  "image/webp",
  "image/gif",
  "image/tiff",
]);
const isPicture = (mime: string): mime is PictureType => PICTURES.has(mime);

const PICTURE_NAMES = new Set(["jpg", "jpeg", "jpe", "jfif", "png", "webp", "gif", "tif", "tiff"]);
const DATA_NAMES = new Set(["csv", "tsv", "txt", "dat", "asc", "prn"]);

/** What people are likely to send by mistake, and what to do instead. */
const ADVICE: Record<string, string> = {
  "image/heic":
    "is a HEIC picture, which browsers cannot show. Set the camera to JPEG (“most compatible”) or export it as JPEG.",
  "image/heif": "is a HEIF picture, which browsers cannot show. Export it as JPEG.",
  "image/bmp": "is a BMP picture. Let the scope save PNG, or convert it.",
  "image/avif": "is an AVIF picture. Export it as JPEG or PNG.",
  "application/pdf": "is a PDF document. Send the page as a picture.",
  "application/zip": "is a ZIP archive. Unpack it and send the files in it.",
  "application/xml": "is an XML or SVG document, which can carry programs. Send a picture or a table of text.",
};

/** Decides by the content, never by the name; a name that says otherwise is a reason to refuse. */
export async function sniff(bytes: Uint8Array, name: string): Promise<Answer<Content>> {
  const content = await contentOf(bytes, name);
  if (!content.ok) return content;
  const extension = extensionOf(name);
  if (content.value.what === "data" && PICTURE_NAMES.has(extension))
    return wrong(name, "is named like a picture but contains text.");
  if (content.value.what === "picture" && DATA_NAMES.has(extension))
    return wrong(name, "is named like a table of text but contains a picture.");
  return content;
}

async function contentOf(bytes: Uint8Array, name: string): Promise<Answer<Content>> {
  if (bytes.length === 0) return refuse("invalid", `${name} is empty (0 bytes). Nothing was kept.`);
  // The mark of UTF-16 text is also how a frame of some sound formats begins.
  const marked = hasUtf16Mark(bytes) && textHead(bytes) !== undefined;
  const found = marked ? undefined : await fileTypeFromBuffer(bytes);
  if (found && isPicture(found.mime)) return ok({ what: "picture", type: found.mime });
  if (found)
    return wrong(
      name,
      ADVICE[found.mime] ?? `is a ${found.ext.toUpperCase()} file. Pictures and tables of text can be kept.`,
    );

  const text = textHead(bytes);
  if (text === undefined) {
    return wrong(
      name,
      PICTURE_NAMES.has(extensionOf(name))
        ? "is named like a picture but is none."
        : "is neither a picture nor a table of text.",
    );
  }
  const start = text
    .replace(/^\ufeff/, "")
    .trimStart()
    .slice(0, 200)
    .toLowerCase();
  if (/^<(!doctype html|html|head|body|script|!--)/.test(start))
    return wrong(name, "is a web page (HTML), not a picture or a table of text.");
  if (start.startsWith("<"))
    return wrong(name, "is an XML or SVG document, which can carry programs. Send a picture or a table of text.");
  const delimiter = delimiterOf(text, text.length < bytes.length);
  if (!delimiter)
    return wrong(name, "is text, but not a table: it needs rows of numbers separated by commas, semicolons or tabs.");
  return ok({ what: "data", type: delimiter === "\t" ? "text/tab-separated-values" : "text/csv" });
}

function wrong(name: string, sentence: string): Answer<never> {
  return refuse("wrong-type", `${name} ${sentence} Nothing was kept.`);
}
