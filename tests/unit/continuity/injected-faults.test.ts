import fc from "fast-check";
import { expect, test } from "vitest";
import {
  findContinuityFaults,
  planProbes,
  PROBE_LIMIT_CLASSES,
  pointBook,
  type ContinuityReport,
} from "@/lib/calc/continuity";
import type { Netlist } from "@/lib/calc/netlist";
import { anyBoard, laidTracks, meter, probeAll, type Track } from "../../support/simulated-board";

const [limits] = PROBE_LIMIT_CLASSES;
if (!limits) throw new Error("There are no limits.");
const planOf = (netlist: Netlist) => planProbes(netlist, { populated: false, limits });

function diagnose(netlist: Netlist, tracks: readonly Track[]): ContinuityReport {
  const isJoined = meter(pointBook(netlist).points.length, tracks);
  const { probes, results } = probeAll(netlist, planOf(netlist).probes, isJoined);
  return findContinuityFaults(netlist, probes, results);
}

const seeds = fc.array(fc.nat(), { minLength: 1, maxLength: 30 });

test("a sound board has no finding and leaves nothing to probe", () => {
  fc.assert(
    fc.property(anyBoard, seeds, (netlist, seed) => {
      const report = diagnose(netlist, laidTracks(netlist, seed));
      expect(report).toEqual({
        findings: [],
        repeat: [],
        left: { continuity: 0, isolation: 0, "follow-up": 0 },
        remarks: [],
      });
    }),
  );
});

test("any single track that is cut is one open, of its net, with the two pieces that the cut makes", () => {
  fc.assert(
    fc.property(anyBoard, seeds, fc.nat(), (netlist, seed, at) => {
      const tracks = laidTracks(netlist, seed);
      const cut = tracks[at % Math.max(1, tracks.length)];
      fc.pre(cut !== undefined);
      if (!cut) return;
      const rest = tracks.filter((track) => track !== cut);
      const { findings } = diagnose(netlist, rest);
      const book = pointBook(netlist);
      const net = book.netOf[cut[0]] ?? 0;
      expect(findings.map(({ kind, nets }) => [kind, nets])).toEqual([["open", [book.netName(net)]]]);
      const isJoined = meter(book.points.length, rest);
      const own = book.points.flatMap((_, point) => (book.netOf[point] === net ? [point] : []));
      const halves = cut.map((end) => own.filter((point) => isJoined(point, end)));
      const sorted = (pieces: readonly number[][]) => pieces.map((piece) => piece.join(" ")).sort();
      expect(sorted(findings[0]?.pieces ?? [])).toEqual(sorted(halves));
    }),
    { numRuns: 300 },
  );
});

test("any short between two nets that the plan holds against each other is one finding, with both names", () => {
  fc.assert(
    fc.property(anyBoard, seeds, fc.nat(), (netlist, seed, at) => {
      const tracks = laidTracks(netlist, seed);
      const isolation = planOf(netlist).probes.filter(({ kind }) => kind === "isolation");
      const pair = isolation[at % Math.max(1, isolation.length)];
      fc.pre(pair !== undefined);
      if (!pair) return;
      const { netOf, netName, points } = pointBook(netlist);
      // The bridge may lie anywhere between the two nets.
      const anyOf = (net: number | undefined) => points.findLastIndex((_, point) => netOf[point] === net);
      const { findings } = diagnose(netlist, [...tracks, [anyOf(netOf[pair.a]), anyOf(netOf[pair.b])]]);
      expect(findings.map(({ kind }) => kind)).toEqual(["short"]);
      expect([...(findings[0]?.nets ?? [])].sort()).toEqual(
        [pair.a, pair.b].map((point) => netName(netOf[point] ?? 0)).sort(),
      );
    }),
    { numRuns: 300 },
  );
});

/** Cuts a track in each of two nets and joins the ends crosswise. */
function crossed(tracks: readonly Track[], one: Track, other: Track): Track[] {
  return [...tracks.filter((track) => track !== one && track !== other), [one[0], other[1]], [other[0], one[1]]];
}

test("any two nets that lie beside each other and change places are one crossed pair, with the pieces that hang together", () => {
  fc.assert(
    fc.property(anyBoard, seeds, fc.nat(), fc.nat(), (netlist, seed, at, more) => {
      const tracks = laidTracks(netlist, seed);
      const book = pointBook(netlist);
      const netOf = ([end]: Track) => book.netOf[end] ?? 0;
      const pairs = planOf(netlist).probes.filter(({ kind }) => kind === "isolation");
      const beside = (a: number, b: number) =>
        pairs.some((pair) => [pair.a, pair.b].every((point) => [a, b].includes(book.netOf[point] ?? -1)));
      const one = tracks[at % Math.max(1, tracks.length)];
      const choices = one
        ? tracks.filter((track) => netOf(track) !== netOf(one) && beside(netOf(track), netOf(one)))
        : [];
      const other = choices[more % Math.max(1, choices.length)];
      fc.pre(one !== undefined && other !== undefined);
      if (!one || !other) return;
      const wrong = crossed(tracks, one, other);
      const { findings } = diagnose(netlist, wrong);
      expect(findings.map(({ kind }) => kind)).toEqual(["crossed"]);
      expect([...(findings[0]?.nets ?? [])].sort()).toEqual(
        [one, other].map((track) => book.netName(netOf(track))).sort(),
      );
      const isJoined = meter(book.points.length, wrong);
      for (const piece of findings[0]?.pieces ?? []) {
        for (const point of piece) expect(isJoined(point, piece[0] ?? -1)).toBe(true);
      }
    }),
    { numRuns: 300 },
  );
});
