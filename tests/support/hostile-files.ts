import { crc32 } from "node:zlib";
import sharp from "sharp";

/** A picture as a phone takes it: lying on its side, with the place it was taken at. */
export function photoWithPlace(width = 120, height = 80): Promise<Buffer> {
  return sharp({ create: { width, height, channels: 3, background: "#12403a" } })
    .composite([
      { input: { create: { width: width / 2, height, channels: 3, background: "#d8cfbb" } }, left: 0, top: 0 },
    ])
    .withMetadata({ orientation: 6 })
    .withExif({
      IFD0: { Make: "Bench Camera", Orientation: "6" },
      IFD3: { GPSLatitudeRef: "N", GPSLatitude: "53/1 33/1 0/1", GPSLongitudeRef: "E", GPSLongitude: "9/1 59/1 0/1" },
    })
    .jpeg()
    .toBuffer();
}

export function plainPng(width = 64, height = 48): Promise<Buffer> {
  return sharp({ create: { width, height, channels: 3, background: "#94460f" } })
    .png()
    .toBuffer();
}

/** A valid PNG header of the given size with next to nothing behind it. */
export function bombPng(width: number, height: number): Buffer {
  const header = Buffer.alloc(13);
  header.writeUInt32BE(width, 0);
  header.writeUInt32BE(height, 4);
  header.set([8, 2, 0, 0, 0], 8);
  const empty = Buffer.from([0x78, 0x9c, 0x03, 0x00, 0x00, 0x00, 0x00, 0x01]);
  const signature = Buffer.from([0x89, 0x50, 0x4e, 0x47, 0x0d, 0x0a, 0x1a, 0x0a]);
  return Buffer.concat([signature, chunk("IHDR", header), chunk("IDAT", empty), chunk("IEND", Buffer.alloc(0))]);
}

function chunk(type: string, data: Buffer): Buffer {
  const body = Buffer.concat([Buffer.from(type, "latin1"), data]);
  const length = Buffer.alloc(4);
  length.writeUInt32BE(data.length);
  const sum = Buffer.alloc(4);
  sum.writeUInt32BE(crc32(body));
  return Buffer.concat([length, body, sum]);
}

export const html = Buffer.from("<!doctype html><title>Not a picture</title><script>alert(1)</script>");
export const svg = Buffer.from('<svg xmlns="http://www.w3.org/2000/svg"><script>alert(1)</script></svg>');
export const pdf = Buffer.from("%PDF-1.7\n1 0 obj\n<<>>\nendobj\n");

/** What a scope saves: a preamble, then rows of numbers. */
export function scopeText(rows: number, delimiter = ","): Buffer {
  const lines = Array.from({ length: rows }, (_, n) => `${(n * 2e-9).toExponential(6)}${delimiter}${(n % 5) * 0.98}`);
  return Buffer.from(["Model,Bench scope", "Sample Interval,2.0e-9", `Time${delimiter}CH1`, ...lines, ""].join("\r\n"));
}
