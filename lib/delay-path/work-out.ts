import {
  delayWindow,
  highestClock,
  pathDelay,
  stepOfPart,
  type ClockLimit,
  type DelayStep,
  type DelayWindow,
  type PathDelay,
} from "@/lib/calc/delay";
import { findFamily, type Family } from "@/lib/calc/levels";
import { findPart, type LogicPart } from "@/lib/calc/logic-parts";
import type { StoredPath } from "./path-shape";

type Knowledge = { own: readonly LogicPart[]; families: readonly Family[] };

export type WorkedOut =
  | { ok: true; given: DelayStep[]; delay: PathDelay; window: DelayWindow; clock: ClockLimit | undefined }
  /** The field is one of the stored path: "steps/2", "derating.board", "clock.setupS". */
  | { ok: false; field: string; message: string };

/** Delay, window and highest clock of a path, with the figures of its parts filled in where none is typed. */
export function workOut(path: StoredPath, { own, families }: Knowledge): WorkedOut {
  const given = path.steps.map((step): DelayStep => {
    const part = own.find(({ number }) => number === step.part) ?? findPart(step.part);
    const known = part && stepOfPart(part, step.family, step.count);
    return {
      name: step.name || (known?.name ?? step.part),
      count: step.count,
      minS: step.minS ?? known?.minS ?? null,
      typicalS: step.typicalS ?? known?.typicalS ?? null,
      maxS: step.maxS ?? known?.maxS ?? null,
    };
  });
  const family = path.derating && findFamily(families, path.derating.family);
  if (path.derating && !family) {
    return { ok: false, field: "derating.family", message: `There is no family ${path.derating.family}.` };
  }
  const { unknownMinShare, unknownMaxShare } = path;
  const derating = path.derating && family ? { ...path.derating, family } : null;
  const delay = pathDelay({ steps: given, derating, unknownMinShare, unknownMaxShare });
  if (!delay.ok) {
    const isCondition = derating !== null && ["board", "typicalAt", "limitsAt"].includes(delay.field);
    return { ...delay, field: isCondition ? `derating.${delay.field}` : delay.field };
  }
  const clock = clockOf(path, delay.value);
  if (clock && !clock.ok) return { ...clock, field: `clock.${clock.field}` };
  return { ok: true, given, delay: delay.value, window: delayWindow(delay.value), clock: clock?.value };
}

function clockOf({ clock }: StoredPath, path: PathDelay) {
  if (!clock) return undefined;
  const { clockToOutputMaxS, setupS, skewS, holdS, clockToOutputMinS } = clock;
  const hold = holdS === null ? null : { holdS, clockToOutputMinS };
  return highestClock({ path, clockToOutputMaxS, setupS, skewS, hold });
}
