import { readIpcD356, readPinList, type NetlistReading } from "@/lib/calc/netlist";
import { splitTable } from "@/lib/pin-map-file/split-table";
import { NETLIST_LIMITS, type NetlistFile } from "./schema";

export type FileRead = { ok: true; reading: NetlistReading } | { ok: false; sentence: string };

/** The same reading in the browser, before anything is kept, and on the server, when it is. */
export function readFile(file: NetlistFile): FileRead {
  const reading = file.source === "ipc-d-356" ? readRecords(file) : readTable(file);
  if (typeof reading === "string") return { ok: false, sentence: reading };
  const { nets, unconnected } = reading.netlist;
  if (nets.length === 0) return { ok: false, sentence: NO_NET[file.source] };
  const points = nets.reduce((sum, net) => sum + net.points.length, unconnected.length);
  if (points > NETLIST_LIMITS.points) return { ok: false, sentence: tooMany(points) };
  return { ok: true, reading };
}

const NO_NET = {
  "ipc-d-356":
    "No net was found in it. Such a file has a line for each point, beginning with 317 or 327 and the net's name.",
  "pin-list": "No net was found in it. Each row needs a net and a pin; say below which columns hold them.",
} as const;

const tooMany = (points: number) =>
  `The file has ${points.toLocaleString("en-GB")} points; at most ${NETLIST_LIMITS.points.toLocaleString("en-GB")} are kept.`;

const readRecords = ({ text, scale }: Extract<NetlistFile, { source: "ipc-d-356" }>): NetlistReading =>
  readIpcD356(text, scale === null ? {} : { scale });

function readTable(file: Extract<NetlistFile, { source: "pin-list" }>): NetlistReading | string {
  const split = splitTable(file.text, file.delimiter, NETLIST_LIMITS.rows);
  if (!split.ok) return split.sentence;
  const { rows } = split.table;
  return readPinList(file.hasHeadings ? rows.slice(1) : rows, file.columns, { unit: file.unit });
}
