import { ok, refuse, type Answer } from "@/lib/actions/answer";
import { FILE_LIMITS } from "./limits";

/** C0, DEL, C1, and lone surrogates, which no file system shows. */
const CONTROL = /[\u0000-\u001f\u007f-\u009f\ud800-\udfff]/u;
/** Marks that turn the direction of writing, so that "exe.gpj" reads as "jpg.exe" the other way round. */
const DIRECTION = /[\u061c\u200e\u200f\u202a-\u202e\u2066-\u2069]/u;
const INVISIBLE = /[\u00ad\u200b\u2060\ufeff]/gu;

/**
 * The name a file is shown and downloaded under; it never becomes a path. Names that carry a path, control characters
 * or direction marks come from no camera and no file dialog and are refused; overlong ones are cut before the extension.
 */
export function cleanFileName(given: string): Answer<string> {
  if (/[/\\]/.test(given))
    return refuse("invalid", "The name of the file contains a path. Rename it and send it again; nothing was kept.");
  if (CONTROL.test(given))
    return refuse(
      "invalid",
      "The name of the file contains control characters. Rename it and send it again; nothing was kept.",
    );
  if (DIRECTION.test(given)) {
    return refuse(
      "invalid",
      "The name of the file contains marks that turn the direction of writing. Rename it and send it again; nothing was kept.",
    );
  }
  const name = given
    .normalize("NFC")
    .replace(INVISIBLE, "")
    .replace(/\s+/gu, " ")
    .trim()
    .replace(/^\.+/, "")
    .replace(/[. ]+$/, "");
  return ok(shorten(name === "" ? "file" : name));
}

export function extensionOf(name: string): string {
  return /\.([a-z0-9]{1,8})$/i.exec(name)?.[1]?.toLowerCase() ?? "";
}

/** The name with the extension that the content has, e.g. "scope.jpeg" for a PNG becomes "scope.png". */
export function withExtension(name: string, extension: string, alsoFine: readonly string[] = []): string {
  const has = extensionOf(name);
  if (has === extension || alsoFine.includes(has)) return name;
  return shorten(`${has === "" ? name : name.slice(0, -has.length - 1)}.${extension}`);
}

function shorten(name: string): string {
  const limit = FILE_LIMITS.fileNameCharacters;
  const characters = [...name];
  if (characters.length <= limit) return name;
  const extension = extensionOf(name);
  const tail = extension === "" ? "" : `.${extension}`;
  return (
    characters
      .slice(0, limit - tail.length - 1)
      .join("")
      .trimEnd() +
    "…" +
    tail
  );
}

/** RFC 6266 with the RFC 8187 form for names beyond ASCII. */
export function contentDisposition(how: "inline" | "attachment", name: string): string {
  const ascii = name.replace(/[^\x20-\x7e]/g, "_").replace(/["\\%]/g, "_");
  const encoded = encodeURIComponent(name).replace(
    /['()*]/g,
    (character) => `%${character.charCodeAt(0).toString(16).toUpperCase()}`,
  );
  return `${how}; filename="${ascii}"; filename*=UTF-8''${encoded}`;
}
