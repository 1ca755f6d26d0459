import type { Study } from "./study";

/** From so many open nets at one part on, it is the part that is looked at first. */
const MANY = 4;

export function reportRemarks({ book, breaks, doubted, pieces }: Study): string[] {
  const remarks = doubted.map(
    ({ probe }) =>
      `${book.label(probe.a)} to ${book.label(probe.b)} read open, but other probes join them: probe it again.`,
  );
  const opensAt = new Map<string, number>();
  for (const net of breaks.keys()) {
    const parts = new Set(
      (pieces.get(net) ?? [])
        .slice(1)
        .flat()
        .map((point) => book.points[point]?.part ?? ""),
    );
    for (const part of parts) if (part !== "") opensAt.set(part, (opensAt.get(part) ?? 0) + 1);
  }
  for (const [part, count] of opensAt) {
    if (count < MANY) continue;
    remarks.push(
      `${count} nets are open at ${part}: see whether it is plugged in, the right way round and not a row too far.`,
    );
  }
  return remarks;
}
