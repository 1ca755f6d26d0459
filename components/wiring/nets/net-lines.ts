import {
  assembleNets,
  netsByPin,
  type Machine,
  type Net,
  type NetPin,
  type SignalClass,
  type Weight,
} from "@/lib/calc/interconnect";
import type { FindingView } from "@/lib/finding/load-findings";

/** A net of the assembled machine as the list shows it. */
export type NetLine = {
  net: Net;
  class: SignalClass;
  /** Cards that it touches, in the order of their slots; the backplane is on all of them. */
  touches: string[];
  /** Findings that name one of its pins, the weightiest first, accepted ones last. */
  findings: FindingView[];
  /** Of the weightiest open finding. */
  weight: Weight | null;
  /** What the search looks through, in small letters. */
  words: string;
};

const WEIGHTS: readonly Weight[] = ["must", "should", "look"];

export function netLines(machine: Machine, findings: readonly FindingView[]): NetLine[] {
  const nets = assembleNets(machine);
  const netOf = netsByPin(nets);
  const found = new Map<Net, Set<FindingView>>();
  for (const finding of findings) {
    for (const pin of finding.pins) {
      const net = netOf(pin);
      if (net) found.set(net, (found.get(net) ?? new Set()).add(finding));
    }
  }
  const classes = new Map(machine.signals.map((signal) => [signal.name, signal.class]));
  const aliases = new Map(machine.signals.map((signal) => [signal.name, signal.aliases]));
  return nets.map((net): NetLine => {
    const own = [...(found.get(net) ?? [])].sort((a, b) => rank(a) - rank(b));
    const touches = placesOf(net.pins);
    const known = net.names.flatMap((name) => aliases.get(name) ?? []);
    return {
      net,
      class: net.names.map((name) => classes.get(name)).find((one) => one !== undefined) ?? classByRole(net.pins),
      touches,
      findings: own,
      weight: own.find(({ accepted }) => accepted === null)?.weight ?? null,
      words: [net.id, ...net.names, ...known, ...touches].join(" ").toLowerCase(),
    };
  });
}

const rank = ({ weight, accepted }: FindingView) => WEIGHTS.indexOf(weight) + (accepted ? WEIGHTS.length : 0);

/** A net of which nobody said anything is what its pins say. */
function classByRole(pins: readonly NetPin[]): SignalClass {
  if (pins.some(({ role }) => role === "ground")) return "ground";
  return pins.some(({ role }) => role === "power") ? "power" : "data";
}

function placesOf(pins: readonly NetPin[]): string[] {
  const cards = pins.filter(({ kind }) => kind === "card");
  const bySlot = [...(cards.length > 0 ? cards : pins)].sort((a, b) => (a.slot ?? 999) - (b.slot ?? 999));
  return [...new Set(bySlot.map(({ label }) => label))];
}

export const PROBLEMS = ["any", "must", "found", "none"] as const;
export type Problem = (typeof PROBLEMS)[number];
export type NetFilter = { search: string; class: SignalClass | null; problem: Problem };

/** The lines that fit every word of the search and both choices. */
export function filterNets(lines: readonly NetLine[], { search, class: kind, problem }: NetFilter): NetLine[] {
  const wanted = search.toLowerCase().split(/\s+/).filter(Boolean);
  return lines.filter(
    (line) =>
      wanted.every((word) => line.words.includes(word)) &&
      (kind === null || line.class === kind) &&
      (problem === "any" ||
        (problem === "must" && line.weight === "must") ||
        (problem === "found" && line.findings.length > 0) ||
        (problem === "none" && line.findings.length === 0)),
  );
}

/** The net that an address names: by its id, or by any name that one of its boards gives it. */
export const netNamed = (lines: readonly NetLine[], name: string): NetLine | undefined =>
  lines.find(({ net }) => net.id === name) ??
  lines.find(({ net }) => net.name === name) ??
  lines.find(({ net }) => net.names.includes(name));

/** "61 nets over 8 boards. 3 have something to mend." */
export function netsSentence(lines: readonly NetLine[], { boards }: Machine): string {
  const count = (many: number, one: string, more: string) => `${many} ${many === 1 ? one : more}`;
  const must = lines.filter(({ weight }) => weight === "must").length;
  const all = `${count(lines.length, "net", "nets")} over ${count(boards.length, "board", "boards")}, put together as the slots say.`;
  return must === 0 ? all : `${all} ${count(must, "has", "have")} something that must be mended.`;
}
