import type { ReworkKind, TouchKind, Wire } from "@/db/schema/faults";

export const KIND_LABELS: Record<ReworkKind, string> = {
  "bodge-wire": "Bodge wire",
  "cut-track": "Cut track",
  "part-swap": "Part swap",
  reflow: "Reflow",
  firmware: "Firmware or table change",
  connector: "Connector re-crimped",
};

export const TOUCH_LABELS: Record<TouchKind, string> = {
  signal: "Signals",
  pin: "Pins",
  part: "Parts",
  block: "Blocks",
  rail: "Rails",
};

type Named = { kind: ReworkKind; number: number; wire: Pick<Wire, "number" | "out"> | null };

/** "Bodge wire W3", "Wire W3 taken out"; without a wire it goes by its rework number: "Cut track, R2". */
export function nameRework({ kind, number, wire }: Named): string {
  if (!wire) return `${KIND_LABELS[kind]}, R${number}`;
  return wire.out ? `Wire ${wire.number} taken out` : `${KIND_LABELS[kind]} ${wire.number}`;
}

/** "U6-12 to U9-3, white". */
export const wireWords = ({ from, to, colour }: Wire): string =>
  `${from} to ${to}${colour === "" ? "" : `, ${colour}`}`;

/** The next free number after W1, W2 …; a wire that is called otherwise does not count. */
export function nextWire(numbers: readonly string[]): string {
  const taken = numbers.flatMap((name) => /^W(\d+)$/i.exec(name.trim())?.[1] ?? []).map(Number);
  return `W${Math.max(0, ...taken) + 1}`;
}
