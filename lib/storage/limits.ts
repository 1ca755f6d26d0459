import type { AttachmentKind } from "@/db/schema/evidence";

const MEGABYTE = 1_000_000;

/** The one place of every limit on files. The interface states them; the server keeps them. */
export const FILE_LIMITS = {
  /** Bytes of one file as it is sent, by kind. */
  bytes: { photo: 25 * MEGABYTE, "scope-picture": 25 * MEGABYTE, "scope-data": 100 * MEGABYTE } satisfies Record<
    AttachmentKind,
    number
  >,
  /** A 48 megapixel phone camera fits; a picture bomb does not. */
  pixels: 64_000_000,
  /** Longest side of a picture: what every browser can still show. */
  side: 16_000,
  fileNameCharacters: 120,
  captionCharacters: 300,
  /** Files chosen, dropped or pasted in one go. */
  filesAtOnce: 20,
  /** Longest side of the two thumbnails. */
  thumbnails: { small: 320, large: 1280 },
} as const;

const PICTURE_TYPES = ["image/jpeg", "image/png", "image/webp"] as const;

/** For the file dialog of the browser; the content decides in the end. */
export const ACCEPT: Record<AttachmentKind, string> = {
  photo: PICTURE_TYPES.join(","),
  "scope-picture": [...PICTURE_TYPES, "image/gif", "image/tiff", ".tif"].join(","),
  "scope-data": ".csv,.tsv,.txt,.dat,text/csv,text/tab-separated-values,text/plain",
};

export const largestBytes = (kinds: readonly AttachmentKind[]): number =>
  Math.max(0, ...kinds.map((kind) => FILE_LIMITS.bytes[kind]));

/** "25 MB", "1.3 MB", "840 kB", "12 bytes". */
export function sizeText(bytes: number): string {
  if (bytes >= MEGABYTE) return `${Number((bytes / MEGABYTE).toFixed(bytes < 10 * MEGABYTE ? 1 : 0))} MB`;
  if (bytes >= 1000) return `${Math.round(bytes / 1000)} kB`;
  return bytes === 1 ? "1 byte" : `${bytes} bytes`;
}

/** What may be sent, in one line for people. */
export function limitsText(kinds: readonly AttachmentKind[]): string {
  const pictures = kinds.filter((kind) => kind !== "scope-data");
  const parts: string[] = [];
  if (pictures.length > 0) {
    const types = pictures.includes("scope-picture") ? "JPEG, PNG, WebP, GIF or TIFF" : "JPEG, PNG or WebP";
    parts.push(`${types} up to ${sizeText(largestBytes(pictures))} and ${FILE_LIMITS.pixels / 1_000_000} megapixels`);
  }
  if (kinds.includes("scope-data"))
    parts.push(
      `scope data as comma, semicolon or tab separated text up to ${sizeText(FILE_LIMITS.bytes["scope-data"])}`,
    );
  return `${parts.join("; ")}.`;
}
