import { alg, Graph } from "@dagrejs/graphlib";
import fc from "fast-check";
import { followUpProbes, type Probe, type ProbeResult } from "@/lib/calc/continuity";
import type { Netlist, NetPoint } from "@/lib/calc/netlist";

/** A piece of copper between two points, by their numbers. */
export type Track = readonly [number, number];

const BARE: Omit<NetPoint, "part" | "pin" | "xMm" | "yMm" | "line"> = {
  kind: "surface",
  isMidPoint: false,
  side: "primary",
  holeMm: null,
  isPlated: null,
  padWidthMm: 1,
  padHeightMm: 0.6,
  turnDeg: 0,
  mask: "none",
};

/** Pads of 1 × 0.6 mm at these places, each of the net whose name stands with it. */
export function boardOf(pads: readonly { net: string; xMm: number; yMm: number; side?: NetPoint["side"] }[]): Netlist {
  const names = [...new Set(pads.map(({ net }) => net))];
  const points = pads.map(({ net, ...place }, at) => ({
    net,
    point: { ...BARE, part: `U${at}`, pin: "1", line: at + 1, ...place },
  }));
  return {
    source: "ipc-d-356",
    nets: names.map((name) => ({ name, points: points.filter(({ net }) => net === name).map(({ point }) => point) })),
    unconnected: [],
    adjacent: [],
    outlines: [],
    toolingHoles: [],
    places: "board",
    facts: [],
  };
}

/** Boards of up to 24 pads on a grid of 1.5 mm, in up to six nets, with or without a rail among them. */
export const anyBoard: fc.Arbitrary<Netlist> = fc
  .uniqueArray(
    fc.record({
      net: fc.constantFrom("A", "B", "C", "D", "GND", "+5V"),
      xMm: fc.integer({ min: 0, max: 7 }).map((step) => step * 1.5),
      yMm: fc.integer({ min: 0, max: 5 }).map((step) => step * 1.5),
      side: fc.constantFrom("primary" as const, "primary" as const, "secondary" as const, "both" as const),
    }),
    { minLength: 2, maxLength: 24, selector: ({ xMm, yMm }) => `${xMm} ${yMm}` },
  )
  .map(boardOf);

/** Tracks as somebody may have laid them: every point of a net to one before it, chosen by the seed. */
export function laidTracks({ nets }: Netlist, seed: readonly number[]): Track[] {
  const tracks: Track[] = [];
  let first = 0;
  for (const { points } of nets) {
    for (let at = 1; at < points.length; at += 1) {
      const before = (seed[(first + at) % Math.max(1, seed.length)] ?? 0) % at;
      tracks.push([first + before, first + at]);
    }
    first += points.length;
  }
  return tracks;
}

/** A meter over the copper as it is, by a graph library's own components. */
export function meter(points: number, tracks: readonly Track[]): (a: number, b: number) => boolean {
  const graph = new Graph({ directed: false });
  for (let at = 0; at < points; at += 1) graph.setNode(String(at));
  for (const [a, b] of tracks) graph.setEdge(String(a), String(b));
  const component = new Map<string, number>();
  alg.components(graph).forEach((members, at) => members.forEach((member) => component.set(member, at)));
  return (a, b) => component.get(String(a)) === component.get(String(b));
}

/** Probes the whole plan and whatever it makes one ask for, until nothing is left to ask. */
export function probeAll(
  netlist: Netlist,
  plan: readonly Probe[],
  isJoined: (a: number, b: number) => boolean,
): { probes: Probe[]; results: ProbeResult[] } {
  const probes = [...plan];
  const results: ProbeResult[] = [];
  const hold = ({ id, a, b }: Probe) => results.push({ probe: id, beeps: isJoined(a, b), ohm: null });
  plan.forEach(hold);
  for (let round = 0; round < 50; round += 1) {
    const more = followUpProbes(netlist, probes, results);
    if (more.length === 0) return { probes, results };
    probes.push(...more);
    more.forEach(hold);
  }
  throw new Error("There is always something left to ask.");
}
