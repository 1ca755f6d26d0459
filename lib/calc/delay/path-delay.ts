import { computed, type Computed } from "../computed";
import { checkPath } from "./check-path";
import { deratingOf, UNCHANGED, type Derate } from "./derate";
import { type DelayPath, type DelayStep, type PathDelay, type StepDelay } from "./path";

/**
 * Delay of a chain of parts.
 * - lowest, typical, worst case: Σ count · delay of each step;
 * - root-sum-square: Σ typical + √(Σ count · (highest − typical)²), each piece varying on its own. Gates of one package
 *   vary together, so this is likely and no bound: name it so wherever it is shown.
 * Always lowest ≤ typical ≤ root-sum-square ≤ worst case. What is not known stays null unless a share is given.
 * Leaves out: the delay of copper (about 6 ns a metre), slow input edges, and which edge of a gate is the slower.
 */
export function pathDelay(path: DelayPath): Computed<PathDelay> {
  const bad = checkPath(path);
  if (bad) return bad;
  const derated = path.derating ? deratingOf(path.derating) : computed(UNCHANGED);
  if (!derated.ok) return derated;

  const steps = path.steps.map((step) => stepDelay(step, path, derated.value));
  const typicalS = sum(steps.map((step) => step.typicalS));
  const worstCaseS = sumOrNull(steps.map((step) => step.maxS));
  const spreads = steps.map(({ count, typicalS: typical, maxS }) =>
    maxS === null ? null : (maxS - typical) ** 2 / count,
  );
  const squares = sumOrNull(spreads);
  // A rounding error must not lift the root-sum-square of one single part above its worst case.
  const rootSumSquareS =
    squares === null || worstCaseS === null ? null : Math.min(worstCaseS, typicalS + Math.sqrt(squares));
  return computed({
    steps,
    minS: sumOrNull(steps.map((step) => step.minS)),
    typicalS,
    worstCaseS,
    rootSumSquareS,
    notes: notesOf(path, steps),
  });
}

function stepDelay(step: DelayStep, path: DelayPath, derate: Derate): StepDelay {
  const { name, count } = step;
  const typical = step.typicalS !== null ? derate.typical(step.typicalS) : derate.max(step.maxS ?? 0);
  // The highest delay stands for an unknown typical one; a share of it would not be low enough for the lowest.
  const shareOf = (share: number | null) => (share === null || step.typicalS === null ? null : typical * share);
  const min = step.minS === null ? shareOf(path.unknownMinShare) : derate.min(step.minS);
  const max = step.maxS === null ? shareOf(path.unknownMaxShare) : derate.max(step.maxS);
  return {
    name,
    count,
    // Figures for other conditions may cross once they are derated; the wider one stands.
    minS: min === null ? null : count * Math.min(min, typical),
    typicalS: count * typical,
    maxS: max === null ? null : count * Math.max(max, typical),
    minAssumed: step.minS === null && min !== null,
    maxAssumed: step.maxS === null && max !== null,
  };
}

const sum = (figures: readonly number[]): number => figures.reduce((total, figure) => total + figure, 0);

const sumOrNull = (figures: readonly (number | null)[]): number | null =>
  figures.reduce((total, figure) => (total === null || figure === null ? null : total + figure), 0);

function notesOf(
  { steps: given, derating, unknownMinShare, unknownMaxShare }: DelayPath,
  steps: StepDelay[],
): string[] {
  const names = (holds: (step: StepDelay) => boolean) =>
    [...new Set(steps.filter(holds).map((s) => s.name))].join(", ");
  const notes: [string, (names: string) => string][] = [
    [names((step) => step.minS === null), (of) => `No lowest delay is known of ${of}: the sum is open below.`],
    [names((step) => step.maxS === null), (of) => `No highest delay is known of ${of}: there is no worst case.`],
    [
      names((step) => step.minAssumed),
      (of) => `Lowest delay of ${of}: ${unknownMinShare} of the typical one, an assumption.`,
    ],
    [
      names((step) => step.maxAssumed),
      (of) => `Highest delay of ${of}: ${unknownMaxShare} times the typical one, an assumption.`,
    ],
    [
      [...new Set(given.filter((step) => step.typicalS === null).map((step) => step.name))].join(", "),
      (of) => `No typical delay is known of ${of}: the highest stands for it.`,
    ],
  ];
  const told = notes.flatMap(([of, write]) => (of ? [write(of)] : []));
  if (!derating) return told;
  const { volts, loadPf } = derating.board;
  return [
    ...told,
    `Figures are turned from the data sheet's conditions to ${volts} V and ${loadPf} pF by rule of thumb.`,
  ];
}
