import { nameCheck, type StandingCheck } from "../check-graph";
import { NO_PACES, type Paces } from "../forecast";
import type { CheckOrder, CriticalPath, OpenCheck, Ordered } from "./check-order";
import { about, counted, whyNow } from "./reasons";
import { studyOpen, type OpenStudy } from "./study-open";

/**
 * What can be done now and what each open check lets go, over units, hold points and prerequisites; and the longest chain by
 * expected time (critical path method: Kelley and Walker, 1959, with one duration a check). A circle is refused with its
 * members. Left out: how many builders there are; see `scheduleChecks`.
 */
export function orderChecks(checks: readonly StandingCheck[], paces: Paces = NO_PACES): Ordered<CheckOrder> {
  const studied = studyOpen(checks, paces);
  if (!studied.ok) return studied;
  const study = studied.value;
  const open = study.order.flatMap((id): OpenCheck[] => {
    const check = study.graph.byId.get(id);
    return check ? [openCheck(check, study)] : [];
  });
  const now = open.flatMap(({ checkId, free }) => (free ? [checkId] : [])).sort((a, b) => study.rank(a, b));
  return { ok: true, value: { open, now, critical: criticalPath(study) } };
}

function openCheck(check: StandingCheck, study: OpenStudy): OpenCheck {
  const { id } = check;
  const waitsFor = [...study.waitsFor(id)];
  return {
    checkId: id,
    free: waitsFor.length === 0,
    waitsFor,
    frees: study.dependants(id).filter((next) => study.waitsFor(next).length === 1),
    holdsBack: study.behind(id).checks,
    tailS: study.tailS(id),
    reason: whyNow(check, study.behind(id)),
  };
}

function criticalPath({ graph, order, dependants, tailS, time }: OpenStudy): CriticalPath | null {
  const longest = (ids: readonly string[]) =>
    ids.reduce<string | undefined>(
      (best, id) => (best === undefined || tailS(id) > tailS(best) ? id : best),
      undefined,
    );
  const path: StandingCheck[] = [];
  for (let at = longest(order); at !== undefined; at = longest(dependants(at))) {
    const check = graph.byId.get(at);
    if (check) path.push(check);
  }
  const [first, last] = [path[0], path.at(-1)];
  if (!first || !last) return null;
  const totalS = tailS(first.id);
  const steps = path.map(({ id, stage }) => ({ checkId: id, expectedS: time.of(stage), startS: totalS - tailS(id) }));
  const isGuess = path.some(({ stage }) => time.isGuess(stage));
  const ends =
    first === last ? nameCheck(first, "") : `from ${nameCheck(first, "")} to ${nameCheck(last, first.serial)}`;
  const sentence = `The longest chain is ${counted(path.length)}, ${ends}: ${about(totalS, isGuess)}.`;
  return { steps, totalS, isGuess, sentence };
}
