import type { Netlist } from "../netlist";
import { findCrossed } from "./crossed";
import type { PointNumber, Probe, ProbeResult } from "./plan";
import { POPULATED_ISOLATION_OHM } from "./populated";
import { studyResults, type Study } from "./study";

const MOST_AT_ONCE = 60;
const MOST_PIECES = 8;
const MOST_OPEN_NETS = 200;

/**
 * Probes that the results call for, numbered on from the plan's: between pieces of an open net that no probe has held against each
 * other, and between pieces of two open nets that lead to the same parts or lie beside each other, which tells crossed wires
 * from plain opens. Hold them against the board and ask again; when there is nothing left to ask, the answer is empty.
 */
export function followUpProbes(netlist: Netlist, probes: readonly Probe[], results: readonly ProbeResult[]): Probe[] {
  const study = studyResults(netlist, probes, results);
  const settled = new Set(findCrossed(study).flatMap(({ nets }) => nets));
  const open = [...study.pieces].filter(([net]) => !settled.has(net)).slice(0, MOST_OPEN_NETS);
  const ask = new Asked(study, probes);
  for (const [, pieces] of open) {
    for (const [one, other] of pairsOf(pieces.slice(0, MOST_PIECES))) ask.add(one, other, "joined");
  }
  for (const hint of [true, false]) {
    for (const [[one, pieces], [other, others]] of pairsOf(open)) {
      if (
        ask.isFull() ||
        ask.isHinted(one, other) !== hint ||
        !(hint || areAlike(study, pieces, others, ask, one, other))
      )
        continue;
      for (const piece of pieces.slice(0, MOST_PIECES)) {
        for (const there of others.slice(0, MOST_PIECES)) ask.addAcross(piece, there);
      }
    }
  }
  return ask.probes;
}

/** Whether both nets lead to two common parts, as the wires of one cable do, or lie beside each other. */
function areAlike(
  { book }: Study,
  pieces: readonly PointNumber[][],
  others: readonly PointNumber[][],
  ask: Asked,
  one: number,
  other: number,
): boolean {
  if (ask.areNeighbours(one, other)) return true;
  const parts = (all: readonly PointNumber[][]) =>
    new Set(all.flat().flatMap((point) => book.points[point]?.part || []));
  const mine = parts(pieces);
  return [...parts(others)].filter((part) => mine.has(part)).length >= 2;
}

class Asked {
  readonly probes: Probe[] = [];
  private readonly known = new Set<string>();
  private readonly neighbours = new Set<string>();
  private readonly hinted = new Set<string>();
  /** Pieces that were found to lead to a piece of the other net: "piece net". */
  private readonly led = new Set<string>();
  private readonly continuityOhm: number;
  private next: number;

  constructor(
    private readonly study: Study,
    planned: readonly Probe[],
  ) {
    const { netOf, pieceOf, said, joins } = study;
    this.next = planned.reduce((most, { id }) => Math.max(most, id + 1), 0);
    this.continuityOhm = planned.find(({ expect }) => expect === "joined")?.limitOhm ?? POPULATED_ISOLATION_OHM;
    // Only open nets are asked about: nothing else needs to be remembered.
    const isOpen = ({ a, b }: Probe) => study.pieces.has(netOf(a)) && study.pieces.has(netOf(b));
    for (const probe of planned) {
      if (!isOpen(probe)) continue;
      const { kind, a, b } = probe;
      if (netOf(a) !== netOf(b)) this.neighbours.add(keyOf(netOf(a), netOf(b)));
      // What is asked already and not answered is not asked again.
      if (kind === "follow-up") this.known.add(keyOf(pieceOf(a), pieceOf(b)));
    }
    for (const { probe } of said) if (isOpen(probe)) this.known.add(keyOf(pieceOf(probe.a), pieceOf(probe.b)));
    for (const { probe } of joins) {
      this.hinted.add(keyOf(netOf(probe.a), netOf(probe.b)));
      this.led.add(`${pieceOf(probe.a)} ${netOf(probe.b)}`).add(`${pieceOf(probe.b)} ${netOf(probe.a)}`);
    }
  }

  isFull = (): boolean => this.probes.length >= MOST_AT_ONCE;
  isHinted = (one: number, other: number): boolean => this.hinted.has(keyOf(one, other));
  areNeighbours = (one: number, other: number): boolean => this.neighbours.has(keyOf(one, other));

  add([a]: readonly PointNumber[], [b]: readonly PointNumber[], expect: Probe["expect"]): void {
    if (a === undefined || b === undefined || this.isFull()) return;
    const key = keyOf(this.study.pieceOf(a), this.study.pieceOf(b));
    if (this.known.has(key)) return;
    this.known.add(key);
    const limitOhm = expect === "joined" ? this.continuityOhm : POPULATED_ISOLATION_OHM;
    this.probes.push({ id: this.next, kind: "follow-up", a, b, expect, limitOhm });
    this.next += 1;
  }

  /** A piece that leads to one piece of the other net cannot lead to another one, which is apart from that. */
  addAcross(piece: readonly PointNumber[], there: readonly PointNumber[]): void {
    const [a = -1] = piece;
    const [b = -1] = there;
    const { netOf, pieceOf } = this.study;
    if (this.led.has(`${pieceOf(a)} ${netOf(b)}`) || this.led.has(`${pieceOf(b)} ${netOf(a)}`)) return;
    this.add(piece, there, "apart");
  }
}

const keyOf = (one: number, other: number): string => (one < other ? `${one} ${other}` : `${other} ${one}`);

function* pairsOf<T>(list: readonly T[]): Generator<[T, T]> {
  for (const [at, one] of list.entries()) for (const other of list.slice(at + 1)) yield [one, other];
}
