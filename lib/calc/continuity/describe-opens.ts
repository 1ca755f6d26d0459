import { listed } from "../netlist";
import type { ContinuityFinding } from "./finding";
import type { PointNumber } from "./plan";
import type { Said, Study } from "./study";

const MOST_NAMED = 3;

/** A net in pieces: which pieces, and between which points. */
export function describeOpen(study: Study, net: number, breaks: readonly Said[]): ContinuityFinding {
  const { book, pieces } = study;
  const own = pieces.get(net) ?? [];
  const name = book.netName(net);
  const between = breaks.map(({ probe }) => `${book.label(probe.a)} and ${book.label(probe.b)}`);
  const stretch = `${between.slice(0, MOST_NAMED).join(", between ")}${between.length > MOST_NAMED ? ` and at ${between.length - MOST_NAMED} more places` : ""}`;
  const sides = own.slice(0, MOST_NAMED).map((piece) => pieceInWords(study, piece));
  if (own.length > MOST_NAMED) sides.push(`and ${own.length - MOST_NAMED} more`);
  return {
    kind: "open",
    nets: [name],
    pieces: own,
    pins: [...new Set(breaks.flatMap(({ probe }) => [book.label(probe.a), book.label(probe.b)]))],
    probes: breaks.map(({ probe }) => probe.id),
    sentence: `${name} is open between ${stretch}: ${sides.join(" | ")}.`,
    lookAt: whereToLook(study, own, breaks),
    mendFirst: "",
  };
}

const pieceInWords = ({ book }: Study, piece: readonly PointNumber[]): string =>
  listed(piece.map((point) => book.label(point)));

/** A point that is apart from all the rest of a larger net is most likely at fault itself. */
function whereToLook({ book }: Study, pieces: readonly PointNumber[][], breaks: readonly Said[]): string {
  const single = pieces.filter((piece) => piece.length === 1).flat();
  const hasRest = pieces.some((piece) => piece.length > 1);
  if (hasRest && single.length > 0) {
    const names = listed(single.map((point) => book.label(point)));
    return `Look at the joint of ${names} first, then along the track to ${single.length === 1 ? "it" : "them"}.`;
  }
  const [first] = breaks;
  if (!first) return "";
  const { a, b } = first.probe;
  return `Look at the joints of ${book.label(a)} and ${book.label(b)}, then along the track between them.`;
}
