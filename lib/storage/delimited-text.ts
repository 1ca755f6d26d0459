/** How the fields of scope data are separated. */
export type Delimiter = "," | ";" | "\t";

/** Enough to tell a table from prose; a scope's preamble is some 40 lines at most. */
const HEAD_BYTES = 64 * 1024;
const CONTROLS = /[\u0000-\u0008\u000b\u000e-\u001a\u001c-\u001f\u007f]/;
const NUMBER = /^[+-]?(\d+([.,]\d*)?|[.,]\d+)(e[+-]?\d+)?$/i;

const utf16Of = (bytes: Uint8Array) =>
  (bytes[0] === 0xff && bytes[1] === 0xfe && "utf-16le") || (bytes[0] === 0xfe && bytes[1] === 0xff && "utf-16be");

export const hasUtf16Mark = (bytes: Uint8Array): boolean => utf16Of(bytes) !== false;

/** The text of the first bytes, or undefined when they are no text. Scopes write UTF-8, UTF-16 or Latin-1. */
export function textHead(bytes: Uint8Array): string | undefined {
  const head = bytes.subarray(0, HEAD_BYTES);
  const utf16 = utf16Of(head);
  if (!utf16 && bytes.includes(0)) return undefined;
  const text = utf16 ? new TextDecoder(utf16).decode(head) : decodeBytes(head);
  return CONTROLS.test(text) ? undefined : text;
}

function decodeBytes(head: Uint8Array): string {
  try {
    // stream: the head may end in the middle of a character.
    return new TextDecoder("utf-8", { fatal: true }).decode(head, { stream: head.length === HEAD_BYTES });
  } catch {
    return new TextDecoder("windows-1252").decode(head);
  }
}

/**
 * The delimiter when the text is a table of numbers, as a scope saves it: after a preamble of any form, rows with the
 * same number of fields (two or more) of which most are numbers. Undefined for prose, lists and programs.
 */
export function delimiterOf(text: string, cutOff: boolean): Delimiter | undefined {
  const lines = text.split(/\r\n|\r|\n/);
  if (cutOff) lines.pop();
  const rows = lines.map((line) => line.trim()).filter((line) => line !== "");
  const body = rows.slice(-Math.max(2, Math.ceil(rows.length / 2)));
  if (body.length < 2) return undefined;
  const found = (["\t", ";", ","] as const).filter((delimiter) => isNumberTable(body, delimiter));
  return found[0];
}

function isNumberTable(rows: string[], delimiter: Delimiter): boolean {
  const fields = rows.map((row) => row.split(delimiter).map((field) => field.trim().replace(/^"(.*)"$/, "$1")));
  const width = fields.at(-1)?.length ?? 0;
  if (width < 2) return false;
  const good = fields.filter((row) => {
    const numbers = row.filter((field) => NUMBER.test(field)).length;
    return row.length === width && numbers >= 1 && numbers * 2 >= row.filter((field) => field !== "").length;
  });
  return good.length >= 2 && good.length >= 0.8 * fields.length;
}
