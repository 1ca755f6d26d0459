/** Text of a file, and what it was written in, or why it is no text. */
export type Decoded = { ok: true; text: string; encoding: string } | { ok: false; sentence: string };

/** Ten thousand rows with long notes fit several times. */
export const MOST_BYTES = 8_000_000;

const NO_TEXT = "This file is no table of text. Save it as CSV or as tab-separated text and take that.";
const CONTROLS = /[\u0000-\u0008\u000b\u000c\u000e-\u001f]/;

/**
 * Reads UTF-8, UTF-16 (with its mark or known by its empty bytes) and, where the bytes are not UTF-8, the Western
 * single-byte code that spreadsheets of the last century write (Windows-1252, of which Latin-1 is a part).
 */
export function decodeFile(bytes: Uint8Array, most = MOST_BYTES): Decoded {
  if (bytes.length > most) {
    return {
      ok: false,
      sentence: `The file has more than ${most / 1e6} MB.${most === MOST_BYTES ? " A pin map of 10,000 rows has about 1 MB." : ""}`,
    };
  }
  if (bytes.length === 0) return { ok: false, sentence: "The file is empty." };
  const encoding = encodingOf(bytes);
  const text = new TextDecoder(encoding).decode(bytes);
  return CONTROLS.test(text) ? { ok: false, sentence: NO_TEXT } : { ok: true, text, encoding: NAMES[encoding] };
}

const NAMES = { "utf-8": "UTF-8", "utf-16le": "UTF-16", "utf-16be": "UTF-16", "windows-1252": "Latin-1" } as const;

function encodingOf(bytes: Uint8Array): keyof typeof NAMES {
  const [first, second] = bytes;
  if (first === 0xff && second === 0xfe) return "utf-16le";
  if (first === 0xfe && second === 0xff) return "utf-16be";
  const emptyByte = emptyBytes(bytes);
  if (emptyByte) return emptyByte;
  try {
    new TextDecoder("utf-8", { fatal: true }).decode(bytes);
    return "utf-8";
  } catch {
    return "windows-1252";
  }
}

/** Plain letters in UTF-16 leave every other byte empty; nothing else that is text does. */
function emptyBytes(bytes: Uint8Array): "utf-16le" | "utf-16be" | undefined {
  const head = bytes.subarray(0, 400);
  const empty = [0, 0];
  head.forEach((byte, at) => {
    if (byte === 0) empty[at % 2] = (empty[at % 2] ?? 0) + 1;
  });
  const [even = 0, odd = 0] = empty;
  const half = head.length / 2;
  if (odd > half * 0.6 && even < half * 0.1) return "utf-16le";
  if (even > half * 0.6 && odd < half * 0.1) return "utf-16be";
  return undefined;
}
