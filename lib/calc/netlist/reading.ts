import type { Netlist } from "./netlist";

/** Something about one line of a file, in a sentence; line 0 is the file as a whole. */
export type LineNote = { line: number; reason: string };

/** A netlist with what became of every line of its file. */
export type NetlistReading = {
  netlist: Netlist;
  /** Lines that count for nothing, each with the reason. */
  passedOver: LineNote[];
  /** Lines that were taken, but that one should look at. */
  warnings: LineNote[];
  /** What was read, for people: "1,204 through holes", in the order in which they matter. */
  read: { what: string; count: number }[];
};
