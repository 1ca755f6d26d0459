import type { Connector } from "../connector";

/** Ways to list a connector the wrong way round: rows exchanged, counted from the other end, or both. */
export const TURNS = ["rows", "positions", "both"] as const;
export type Turn = (typeof TURNS)[number];

/** Rows stand at offsets that are sums of a pitch; to a hundredth of a millimetre they can be compared. */
const place = (offsetMm: number, position: number) => `${Math.round(offsetMm * 100)} ${position}`;

const maps = new WeakMap<Connector, WeakMap<Connector, Map<Turn, Map<string, string>>>>();

/**
 * For each pin of one face the pin of another that stands where it would be if turned: a for c (with b in its place), n
 * for 33 − n, odd for even. In small letters; pins that land on no pin are left out. Turned twice is where it was.
 */
export function turnedPins(from: Connector, to: Connector, turn: Turn): ReadonlyMap<string, string> {
  const ofFrom = maps.get(from) ?? new WeakMap<Connector, Map<Turn, Map<string, string>>>();
  maps.set(from, ofFrom);
  const ofBoth = ofFrom.get(to) ?? new Map<Turn, Map<string, string>>();
  ofFrom.set(to, ofBoth);
  const known = ofBoth.get(turn);
  if (known) return known;
  const built = build(from, to, turn);
  ofBoth.set(turn, built);
  return built;
}

function build(from: Connector, to: Connector, turn: Turn): Map<string, string> {
  const across = Math.max(0, ...from.rows.map((row) => row.offsetMm));
  const there = new Map(
    to.pins.map((pin) => [place(to.rows[pin.row]?.offsetMm ?? 0, pin.position), pin.name.toLowerCase()]),
  );
  const pairs = from.pins.flatMap((pin): [string, string][] => {
    const offset = from.rows[pin.row]?.offsetMm ?? 0;
    const row = turn === "positions" ? offset : across - offset;
    const position = turn === "rows" ? pin.position : from.positions + 1 - pin.position;
    const name = there.get(place(row, position));
    return name === undefined ? [] : [[pin.name.toLowerCase(), name]];
  });
  return new Map(pairs);
}

/** "row a for c", "odd for even", "position n for 33 − n". */
export function turnWords({ rows, positions }: Connector, turn: Turn): string {
  const [first, last] = [rows[0]?.name ?? "", rows.at(-1)?.name ?? ""];
  const isLetters = rows.every(({ name }) => name.length === 1);
  const kind = isLetters ? `row ${first} for ${last}` : `${first} for ${last}`;
  const along = `position n for ${positions + 1}\u202f−\u202fn`;
  return turn === "rows" ? kind : turn === "positions" ? along : `${kind} and ${along}`;
}
