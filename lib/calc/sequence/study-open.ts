import {
  describeCircle,
  openGraph,
  putInOrder,
  readGraph,
  turnedRound,
  type CheckGraph,
  type StandingCheck,
} from "../check-graph";
import type { Paces } from "../forecast";
import type { Ordered } from "./check-order";
import { countBehind, type Behind } from "./count-behind";
import { expectedTime, type ExpectedTime } from "./expected-time";

/** The open checks, with all that ranking and planning look at. */
export type OpenStudy = {
  graph: CheckGraph<StandingCheck>;
  /** Breaks no prerequisite and no hold. */
  order: string[];
  waitsFor(id: string): readonly string[];
  dependants(id: string): readonly string[];
  behind(id: string): Behind;
  time: ExpectedTime;
  /** From the beginning of a check to the end of the longest chain behind it, s. */
  tailS(id: string): number;
  /** The more urgent of two first: by what waits for it, by how it stands, by the chain behind it, by place. */
  rank(one: string, other: string, unitOnBench?: string): number;
};

/** A circle is refused even if all its members hold: prerequisites never form one (`domain.md` rule 9). */
export function studyOpen(checks: readonly StandingCheck[], paces: Paces): Ordered<OpenStudy> {
  const whole = readGraph(checks);
  const all = putInOrder(whole.reliesOn);
  if (!all.ok) {
    const members = all.circle.flatMap((id) => whole.byId.get(id) ?? []);
    return { ok: false, circle: all.circle, message: describeCircle(members) };
  }
  const graph = openGraph(checks);
  const open = putInOrder(graph.reliesOn);
  const order = open.ok ? open.order : [];
  const turned = turnedRound(graph.reliesOn);
  const dependants = (id: string) => turned.get(id) ?? [];
  const time = expectedTime(paces);
  const count = countBehind(graph, order);
  const behind = new Map(order.map((id) => [id, count(id)]));
  const tails = new Map<string, number>();
  for (const id of [...order].reverse()) {
    const stage = graph.byId.get(id)?.stage ?? "function";
    tails.set(id, time.of(stage) + Math.max(0, ...dependants(id).map((next) => tails.get(next) ?? 0)));
  }
  const study = {
    graph,
    order,
    waitsFor: (id: string) => graph.reliesOn.get(id) ?? [],
    dependants,
    behind: (id: string) => behind.get(id) ?? { checks: 0, units: [] },
    time,
    tailS: (id: string) => tails.get(id) ?? 0,
  };
  return { ok: true, value: { ...study, rank: ranking(study) } };
}

const URGENCY: readonly StandingCheck["state"][] = ["failed", "reopened", "doubtful", "untested", "waiting"];

function ranking({ graph, behind, tailS }: Omit<OpenStudy, "rank">): OpenStudy["rank"] {
  const place = new Map(graph.checks.map(({ id }, at) => [id, at]));
  const urgency = (id: string) => URGENCY.indexOf(graph.byId.get(id)?.state ?? "waiting");
  const isElsewhere = (id: string, unit?: string) => Number(graph.byId.get(id)?.unitId !== unit);
  return (one, other, unit) =>
    behind(other).checks - behind(one).checks ||
    urgency(one) - urgency(other) ||
    (unit === undefined ? 0 : isElsewhere(one, unit) - isElsewhere(other, unit)) ||
    tailS(other) - tailS(one) ||
    (place.get(one) ?? 0) - (place.get(other) ?? 0);
}
