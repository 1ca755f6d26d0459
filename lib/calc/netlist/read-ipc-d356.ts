import { assemble } from "./ipc/assemble";
import { IpcReader } from "./ipc/reader";
import type { IpcScale } from "./ipc/scale";
import type { NetlistReading } from "./reading";

/**
 * Reads IPC-D-356 and IPC-D-356A: points with net, part, pin, hole, side, place and pad, long names through their aliases,
 * continuations, neighbours, outlines and tooling holes. Line ends of all systems, blanks behind, lines beyond 80 columns and
 * part names that push the columns aside are taken. Never throws: what cannot be used is passed over, line by line.
 *
 * Columns were read in the sources of four open readers and writers and in a test-equipment maker's account of the format,
 * and checked on real exports; the standard itself was not opened. Tracks, masks, panels and parts between nets are counted,
 * not kept. `scale` stands above the header, for writers that mean other units than they name.
 */
export function readIpcD356(text: string, { scale }: { scale?: IpcScale } = {}): NetlistReading {
  const reader = new IpcReader(scale);
  const plain = text.includes("\r") ? text.replace(/\r\n?/g, "\n") : text;
  let number = 0;
  let from = plain.startsWith("\ufeff") ? 1 : 0;
  while (from <= plain.length) {
    const next = plain.indexOf("\n", from);
    const end = next === -1 ? plain.length : next;
    number += 1;
    reader.take(plain.slice(from, end).trimEnd(), number);
    from = end + 1;
  }
  return assemble(reader, scale);
}
