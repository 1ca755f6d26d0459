import { create } from "qrcode";

export type QrCode = { size: number; path: string };

/** QR codes (ISO/IEC 18004, error correction L: clean paper, short distance) as one SVG path each, drawn on the server. */
export async function qrCodes(addresses: readonly (readonly [string, string])[]): Promise<Record<string, QrCode>> {
  return Object.fromEntries(addresses.map(([id, address]) => [id, qrCode(address)]));
}

function qrCode(address: string): QrCode {
  const { size, data } = create(address, { errorCorrectionLevel: "L" }).modules;
  const runs: string[] = [];
  for (let row = 0; row < size; row += 1) {
    for (let column = 0; column < size; column += 1) {
      if (!data[row * size + column]) continue;
      const from = column;
      while (column + 1 < size && data[row * size + column + 1]) column += 1;
      runs.push(`M${from} ${row}h${column - from + 1}v1h-${column - from + 1}z`);
    }
  }
  return { size, path: runs.join("") };
}
