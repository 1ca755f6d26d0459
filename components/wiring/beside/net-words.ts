import type { Net, NetPin, PinRole } from "@/lib/calc/interconnect";

const DRIVES: readonly PinRole[] = ["push-pull output", "three-state output", "open-drain output", "bidirectional"];
const READS: readonly PinRole[] = ["input", "bidirectional"];

export const driversOf = (net: Net): NetPin[] => net.pins.filter(({ role }) => DRIVES.includes(role));

/** Labels once each, in the net's order: "CON-01, CON-02"; many are counted. */
export function labelsOf(pins: readonly { label: string }[], most = 3): string {
  const labels = [...new Set(pins.map(({ label }) => label))];
  return labels.length > most ? `${labels.length} boards` : labels.join(", ");
}

/** "CON-01 a10"; with the connector's name where the board has several of them. */
export const placeWords = (
  { label, board, connector }: Pick<NetPin, "label" | "board" | "connector">,
  hasSeveral: (board: string) => boolean,
): string => (hasSeveral(board) ? `${label} ${connector}` : label);

export type NetPart = { words: string; pins: NetPin[] };

/** Who is on the net and what each does there: drivers, then receivers, supplies and what only passes on. */
export function partsOf(net: Net): NetPart[] {
  const parts: NetPart[] = [
    { words: "driven by", pins: driversOf(net) },
    { words: "read by", pins: net.pins.filter(({ role }) => READS.includes(role)) },
    { words: "supply", pins: net.pins.filter(({ role }) => role === "power") },
    { words: "ground", pins: net.pins.filter(({ role }) => role === "ground") },
    { words: "passed on by", pins: net.pins.filter(({ role }) => role === "passive" || role === "no connection") },
  ];
  return parts.filter(({ pins }) => pins.length > 0);
}
