import { fault, needsNotNegative, type Fault } from "../computed";
import { type DelayPath, type DelayStep } from "./path";

const MOST_PIECES = 10_000;

/** What keeps a path from being added up; the field is "steps/2" or the name of the share. */
export function checkPath({ steps, unknownMinShare, unknownMaxShare }: DelayPath): Fault | undefined {
  if (steps.length === 0) return fault("steps", "The path has no step: add the parts that the signal passes.");
  for (const [index, step] of steps.entries()) {
    const bad = checkStep(`steps/${index}`, index + 1, step);
    if (bad) return bad;
  }
  if (unknownMinShare !== null && !(unknownMinShare >= 0 && unknownMinShare <= 1))
    return fault("unknownMinShare", "The share for an unknown lowest delay must be from 0 to 1.");
  if (unknownMaxShare !== null && !(unknownMaxShare >= 1 && unknownMaxShare <= 10))
    return fault("unknownMaxShare", "The share for an unknown highest delay must be from 1 to 10.");
  return undefined;
}

function checkStep(field: string, row: number, step: DelayStep): Fault | undefined {
  const what = `Step ${row} (${step.name})`;
  if (!Number.isInteger(step.count) || step.count < 1 || step.count > MOST_PIECES)
    return fault(field, `${what}: ${step.count} is no count. Give a whole number from 1 to ${MOST_PIECES}.`);
  const known: [string, number | null][] = [
    ["lowest", step.minS],
    ["typical", step.typicalS],
    ["highest", step.maxS],
  ];
  let before: [string, number] | undefined;
  for (const [words, seconds] of known) {
    if (seconds === null) continue;
    const bad = needsNotNegative(field, `${words} delay of step ${row} (${step.name})`, seconds);
    if (bad) return bad;
    if (before && seconds < before[1])
      return fault(field, `${what}: the ${words} delay is below the ${before[0]} one.`);
    before = [words, seconds];
  }
  if (step.typicalS === null && step.maxS === null)
    return fault(field, `${what} has no delay: give at least the typical or the highest one.`);
  return undefined;
}
