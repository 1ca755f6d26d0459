import { isRailName, type PointBook } from "@/lib/calc/continuity";

/** Gap between two pads that still lie beside each other, mm; as the plan has it. */
const NEIGHBOUR_MM = 1.27;
/** Where the size of a pad is not known, mm. */
const USUAL_PAD_MM = 2;

/** At most how many pairs of nets the plan can take for neighbours or rails, before it is made. */
export function countClosePairs({ points, x, y, nets, netName }: PointBook, rails: readonly string[]): number {
  const reach = points.map(({ padWidthMm, padHeightMm }) =>
    Math.max(padWidthMm ?? USUAL_PAD_MM, padHeightMm ?? USUAL_PAD_MM),
  );
  let close = 0;
  for (let one = 0; one < points.length; one += 1) {
    for (let other = one + 1; other < points.length; other += 1) {
      const far = ((reach[one] ?? 0) + (reach[other] ?? 0)) / 2 + NEIGHBOUR_MM;
      // A place that is not known is beside nothing: every comparison with it is false.
      const isClose =
        Math.abs((x[one] ?? NaN) - (x[other] ?? NaN)) <= far && Math.abs((y[one] ?? NaN) - (y[other] ?? NaN)) <= far;
      if (isClose) close += 1;
    }
  }
  const named = new Set(rails);
  const count = Array.from({ length: nets }, (_, net) => netName(net)).filter(
    (name) => named.has(name) || isRailName(name),
  ).length;
  return close + (count * (count - 1)) / 2;
}
