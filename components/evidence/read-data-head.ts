const HEAD_BYTES = 2048;
const LINES = 14;

/** The first lines of a text file; only its first bytes are fetched. */
export async function readDataHead(address: string, bytes: number, signal: AbortSignal): Promise<string> {
  const response = await fetch(address, { headers: { range: `bytes=0-${HEAD_BYTES - 1}` }, signal });
  if (!response.ok) throw new Error(`status ${response.status}`);
  const head = new Uint8Array(await response.arrayBuffer()).subarray(0, HEAD_BYTES);
  const lines = decode(head).split(/\r\n|\r|\n/);
  // The last one is cut off in the middle unless the whole file is shorter.
  if (bytes > HEAD_BYTES) lines.pop();
  return lines.slice(0, LINES).join("\n") + (bytes > HEAD_BYTES || lines.length > LINES ? "\n…" : "");
}

/** Scopes write UTF-16 with a mark, UTF-8, or the bytes of a desktop of the nineties. */
function decode(head: Uint8Array): string {
  if (head[0] === 0xff && head[1] === 0xfe) return new TextDecoder("utf-16le").decode(head);
  if (head[0] === 0xfe && head[1] === 0xff) return new TextDecoder("utf-16be").decode(head);
  const text = new TextDecoder().decode(head, { stream: true });
  return text.includes("\ufffd") ? new TextDecoder("windows-1252").decode(head) : text;
}
