import { nameCheck, type StandingCheck } from "../check-graph";
import { NO_PACES, type Paces } from "../forecast";
import type { Ordered, Schedule, ScheduledCheck, ScheduleRequest } from "./check-order";
import { about, counted, whyNow } from "./reasons";
import { formatDuration } from "../units";
import { studyOpen, type OpenStudy } from "./study-open";

type Builder = { number: 1 | 2; freeAtS: number; unit: string | undefined; isDone: boolean };

/**
 * What one or two builders do in the time there is: list scheduling (Graham, Bounds on multiprocessing timing anomalies, SIAM
 * J. Appl. Math. 17, 1969). Whoever is free takes the first check by rank that is free, fits into the time and whose board
 * nobody has in hand; a check is free when all that it waits for is done. The boards in the rack are one: only one builder
 * does integration checks at a time. Of equal checks one stays with the board on the bench.
 *
 * Takes for granted that every check passes at its stage's pace. Greedy: it need not be the best of all plans.
 */
export function scheduleChecks(
  checks: readonly StandingCheck[],
  { builders, seconds }: ScheduleRequest,
  paces: Paces = NO_PACES,
): Ordered<Schedule> {
  const studied = studyOpen(checks, paces);
  if (!studied.ok) return studied;
  const study = studied.value;
  const lines = run(study, builders, seconds);
  const usedS = Math.max(0, ...lines.map(({ endS }) => endS));
  const left = study.order.length - lines.length;
  const isGuess = lines.some(({ checkId }) => study.time.isGuess(study.graph.byId.get(checkId)?.stage ?? "function"));
  const sentence = say(study, lines.length, left, usedS, seconds, isGuess);
  return { ok: true, value: { lines, usedS, left, isGuess, sentence } };
}

function run(study: OpenStudy, builders: 1 | 2, seconds: number): ScheduledCheck[] {
  const crew: Builder[] = ([1, 2] as const)
    .slice(0, builders)
    .map((number) => ({ number, freeAtS: 0, unit: undefined, isDone: false }));
  const waits = new Map(study.order.map((id) => [id, study.waitsFor(id).length]));
  const free = new Set(study.order.filter((id) => waits.get(id) === 0));
  const lines: ScheduledCheck[] = [];
  let running: { check: StandingCheck; endS: number }[] = [];
  for (let next = firstFree(crew); next; next = firstFree(crew)) {
    const nowS = next.freeAtS;
    for (const { check } of running.filter(({ endS }) => endS <= nowS)) {
      for (const id of study.dependants(check.id)) {
        const left = (waits.get(id) ?? 0) - 1;
        waits.set(id, left);
        if (left === 0) free.add(id);
      }
    }
    running = running.filter(({ endS }) => endS > nowS);
    const check = pick(
      study,
      free,
      next,
      running.map((one) => one.check),
      seconds - nowS,
    );
    if (check) {
      const endS = nowS + study.time.of(check.stage);
      free.delete(check.id);
      running.push({ check, endS });
      const reason = reasonOf(study, check, lines);
      lines.push({ checkId: check.id, builder: next.number, startS: nowS, endS, reason });
      next.freeAtS = endS;
      next.unit = check.unitId;
    } else if (running.length > 0) {
      next.freeAtS = Math.min(...running.map(({ endS }) => endS));
    } else {
      next.isDone = true;
    }
  }
  return lines;
}

const firstFree = (crew: readonly Builder[]): Builder | undefined =>
  crew.filter(({ isDone }) => !isDone).sort((a, b) => a.freeAtS - b.freeAtS)[0];

function pick(
  { graph, time, rank }: OpenStudy,
  free: ReadonlySet<string>,
  { unit }: Builder,
  running: readonly StandingCheck[],
  leftS: number,
): StandingCheck | undefined {
  const isRackTaken = running.some(({ stage }) => stage === "integration");
  return [...free]
    .flatMap((id) => graph.byId.get(id) ?? [])
    .filter(({ stage, unitId }) => {
      const isInHand = running.some((other) => other.unitId === unitId);
      return !isInHand && !(isRackTaken && stage === "integration") && time.of(stage) <= leftS;
    })
    .reduce<StandingCheck | undefined>(
      (best, check) => (best === undefined || rank(check.id, best.id, unit) < 0 ? check : best),
      undefined,
    );
}

/** With the check of the plan that lets it go last, where it is not free from the start. */
function reasonOf(study: OpenStudy, check: StandingCheck, lines: readonly ScheduledCheck[]): string {
  const why = whyNow(check, study.behind(check.id));
  const needed = new Set(study.waitsFor(check.id));
  const last = lines.filter(({ checkId }) => needed.has(checkId)).sort((a, b) => b.endS - a.endS)[0];
  const before = last && study.graph.byId.get(last.checkId);
  return before ? `${why} Free once ${nameCheck(before, check.serial)} is done.` : why;
}

function say(
  { order, graph, waitsFor, time }: OpenStudy,
  done: number,
  left: number,
  usedS: number,
  seconds: number,
  isGuess: boolean,
): string {
  if (order.length === 0) return "Every check holds.";
  if (done > 0) {
    return `${counted(done)} in ${about(usedS, isGuess)}; ${left === 0 ? "nothing is left" : `${left} left`}.`;
  }
  const free = order.filter((id) => waitsFor(id).length === 0);
  const shortest = Math.min(...free.map((id) => time.of(graph.byId.get(id)?.stage ?? "function")));
  return `No check fits into ${formatDuration(seconds)}: the shortest takes about ${formatDuration(shortest)}.`;
}
