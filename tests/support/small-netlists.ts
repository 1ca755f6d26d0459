import { PIN_LIST_COLUMNS, readPinList, type Netlist } from "@/lib/calc/netlist";

/** A netlist as one writes it down in a test: nets with their pins, "U1-3". */
export function netlistOf(nets: Record<string, readonly string[]>, unconnected: readonly string[] = []): Netlist {
  const all: [string, readonly string[]][] = [...Object.entries(nets), ["", unconnected]];
  const rows = all.flatMap(([net, pins]) => pins.map((pin) => [net, ...pin.split("-")]));
  const reading = readPinList(
    rows.map((cells, at) => ({ line: at + 1, cells })),
    PIN_LIST_COLUMNS,
  );
  if (reading.passedOver.length > 0) throw new Error("The netlist of this test is not as it should be.");
  return reading.netlist;
}
