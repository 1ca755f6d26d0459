import { listed } from "../netlist";
import type { CrossedGroup } from "./crossed";
import type { ContinuityFinding } from "./finding";
import type { PointNumber } from "./plan";
import type { Study } from "./study";

export function describeCrossed(study: Study, { nets, joins, coppers }: CrossedGroup): ContinuityFinding {
  const { book, breaks, pieces, pieceOf } = study;
  const names = nets.map((net) => book.netName(net));
  const opens = nets.flatMap((net) => breaks.get(net) ?? []);
  const ends = nets.map((net) => smallest(pieces.get(net) ?? []));
  const leads = joins.map(({ probe }) => `${book.label(probe.a)} leads to ${book.label(probe.b)}`);
  const members = new Map<number, PointNumber[]>();
  for (const piece of nets.flatMap((net) => pieces.get(net) ?? [])) members.set(pieceOf(piece[0] ?? -1), piece);
  return {
    kind: "crossed",
    nets: names,
    pieces: coppers.map((copper) => copper.flatMap((piece) => members.get(piece) ?? [])),
    pins: [...new Set(joins.flatMap(({ probe }) => [book.label(probe.a), book.label(probe.b)]))],
    probes: [...opens, ...joins].map(({ probe }) => probe.id),
    sentence: `${listed(names)} change places: ${listed(leads, 6)}.`,
    lookAt: `Look at ${sharedParts(study, ends).join(" or ")}: the ${nets.length === 2 ? "two wires are" : "wires are"} the wrong way round there.`,
    mendFirst: "",
  };
}

/** Points of the smallest piece, or of all that are as small: the end that is wrong, or both ends of a cable. */
function smallest(pieces: readonly PointNumber[][]): PointNumber[] {
  const size = pieces.at(-1)?.length;
  return pieces.filter((piece) => piece.length === size).flat();
}

/** Parts that the smallest pieces of all nets hang on. */
function sharedParts({ book }: Study, ends: readonly PointNumber[][]): string[] {
  const partsOf = (piece: readonly PointNumber[]) => new Set(piece.flatMap((point) => book.points[point]?.part || []));
  const [first = new Set<string>(), ...others] = ends.map(partsOf);
  const shared = [...first].filter((part) => others.every((parts) => parts.has(part)));
  return shared.length > 0 ? shared : ends.flatMap((piece) => piece.slice(0, 1)).map((point) => book.label(point));
}
