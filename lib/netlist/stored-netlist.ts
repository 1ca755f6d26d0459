import type { Netlist } from "@/lib/calc/netlist";

/** What keepNetlist() wrote: the same type by construction, and the column is never changed. */
export const storedNetlist = (content: unknown): Netlist => content as Netlist;
