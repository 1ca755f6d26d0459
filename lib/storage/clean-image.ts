import sharp, { type Metadata } from "sharp";
import { ok, refuse, type Answer } from "@/lib/actions/answer";
import { FILE_LIMITS } from "./limits";
import type { PictureType } from "./sniff";

export type CleanImage = {
  bytes: Buffer;
  mediaType: "image/jpeg" | "image/png" | "image/webp";
  extension: "jpg" | "png" | "webp";
  width: number;
  height: number;
};

/** Decoding a large picture takes some hundred megabytes: one after the other. */
let queue: Promise<unknown> = Promise.resolve();
const TIMEOUT_SECONDS = 30;

/**
 * Decodes the whole picture and encodes it again: whatever else the file carried (EXIF, GPS, comments, a second file
 * behind the picture) is gone, and the orientation is in the pixels. Truncated and oversized ones get a sentence.
 */
export function cleanImage(bytes: Uint8Array, type: PictureType, name: string): Promise<Answer<CleanImage>> {
  const turn = queue.then(() => clean(bytes, type, name));
  queue = turn.catch(() => undefined);
  return turn;
}

async function clean(bytes: Uint8Array, type: PictureType, name: string): Promise<Answer<CleanImage>> {
  const header = await readHeader(bytes);
  if (!header)
    return refuse("wrong-type", `${name} starts like a picture but cannot be read as one. Nothing was kept.`);
  const { width, height } = header;
  if (width * height > FILE_LIMITS.pixels || Math.max(width, height) > FILE_LIMITS.side) {
    const limit = `${FILE_LIMITS.pixels / 1_000_000} megapixels and ${FILE_LIMITS.side} pixels on a side`;
    return refuse("too-large", `${name} is ${width} × ${height} pixels; the most is ${limit}. Nothing was kept.`);
  }
  try {
    const picture = sharp(bytes, { failOn: "error", limitInputPixels: FILE_LIMITS.pixels, sequentialRead: true })
      .autoOrient()
      .timeout({ seconds: TIMEOUT_SECONDS });
    const target = TARGETS[type];
    const encoded =
      target === "jpg"
        ? picture.jpeg({ quality: 90 })
        : target === "webp"
          ? picture.webp({ quality: 90 })
          : picture.png();
    const { data, info } = await encoded.toBuffer({ resolveWithObject: true });
    return ok({
      bytes: data,
      mediaType: MEDIA_TYPES[target],
      extension: target,
      width: info.width,
      height: info.height,
    });
  } catch (error) {
    if (error instanceof Error && error.message.includes("timeout")) {
      return refuse(
        "too-large",
        `${name} took longer than ${TIMEOUT_SECONDS} s to decode. Send a smaller picture; nothing was kept.`,
      );
    }
    return refuse(
      "wrong-type",
      `${name} is damaged or was cut off on its way. Send it again from where it was taken; nothing was kept.`,
    );
  }
}

const TARGETS = {
  "image/jpeg": "jpg",
  "image/png": "png",
  "image/webp": "webp",
  "image/gif": "png",
  "image/tiff": "png",
} as const;
const MEDIA_TYPES = { jpg: "image/jpeg", png: "image/png", webp: "image/webp" } as const;

/** Reads the header only, so that a bomb can be named by its size without being decoded. */
async function readHeader(bytes: Uint8Array): Promise<Pick<Metadata, "width" | "height"> | undefined> {
  try {
    const { width, height } = await sharp(bytes, { limitInputPixels: false }).metadata();
    return width > 0 && height > 0 ? { width, height } : undefined;
  } catch {
    return undefined;
  }
}
