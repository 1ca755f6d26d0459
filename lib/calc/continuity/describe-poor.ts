import { shortQuantity } from "../units";
import { addTo } from "./add-to";
import type { ContinuityFinding } from "./finding";
import { mendFirst } from "./describe-shorts";
import type { Said, Study } from "./study";

/** Joined, but badly, one finding a net; apart, but not well enough, one a pair of nets. */
export function describePoor(study: Study): ContinuityFinding[] {
  const { book, netOf } = study;
  const groups = new Map<string, Said[]>();
  for (const one of study.said) {
    if (one.outcome !== "poor") continue;
    const [a, b] = [netOf(one.probe.a), netOf(one.probe.b)];
    const key = a < b ? `${a} ${b}` : `${b} ${a}`;
    addTo(groups, key, one);
  }
  return [...groups.values()].flatMap((group) => {
    const isHigh = group.some(({ probe }) => probe.expect === "joined");
    const [worst] = [...group].sort((one, other) => ((one.ohm ?? 0) - (other.ohm ?? 0)) * (isHigh ? -1 : 1));
    if (!worst) return [];
    const { a, b, limitOhm } = worst.probe;
    const names = [...new Set([netOf(a), netOf(b)])].map((net) => book.netName(net));
    const open = [netOf(a), netOf(b)].filter((net) => study.pieces.has(net)).map((net) => book.netName(net));
    const more = group.length > 1 ? ` So do ${group.length - 1} more.` : "";
    const points = [...new Set(group.flatMap(({ probe }) => [probe.a, probe.b]))];
    const reads = `${book.label(a)} to ${book.label(b)} reads ${shortQuantity(worst.ohm ?? 0, "Ω")}`;
    const limit = shortQuantity(limitOhm, "Ω");
    return [
      {
        kind: isHigh ? ("high resistance" as const) : ("leak" as const),
        nets: names,
        pieces: [points],
        pins: points.map((point) => book.label(point)),
        probes: group.map(({ probe }) => probe.id),
        sentence: `${names.join(" against ")}: ${reads}; it should be ${isHigh ? "at most" : "at least"} ${limit}.${more}`,
        lookAt: isHigh
          ? `Look for a cold joint or a worn contact at ${book.label(a)} and ${book.label(b)}, and at thin copper between them.`
          : `Clean flux off between ${book.label(a)} and ${book.label(b)}; then look for whiskers, and for parts that join the two.`,
        mendFirst: isHigh || open.length === 0 ? "" : mendFirst([...new Set(open)]),
      },
    ];
  });
}
