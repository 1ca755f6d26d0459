import { pathDelay, type DelayPath, type DelayStep, type Derating, type PathDelay } from "@/lib/calc/delay";
import { FAMILIES, findFamily, type Family } from "@/lib/calc/levels";

export const NS = 1e-9;

/** Delays in ns. */
export const step = (
  name: string,
  count: number,
  min: number | null,
  typical: number | null,
  max: number | null,
): DelayStep => {
  const seconds = (ns: number | null) => (ns === null ? null : ns / 1e9);
  return { name, count, minS: seconds(min), typicalS: seconds(typical), maxS: seconds(max) };
};

export const path = (steps: DelayStep[], more: Partial<DelayPath> = {}): DelayPath => ({
  steps,
  derating: null,
  unknownMinShare: null,
  unknownMaxShare: null,
  ...more,
});

export function delayOf(given: DelayPath): PathDelay {
  const result = pathDelay(given);
  if (!result.ok) throw new Error(result.message);
  return result.value;
}

/** Empty where the path can be added up. */
export function messageOf(given: DelayPath): string {
  const result = pathDelay(given);
  return result.ok ? "" : `${result.field}: ${result.message}`;
}

export function family(name: string): Family {
  const found = findFamily(FAMILIES, name);
  if (!found) throw new Error(`there is no ${name}`);
  return found;
}

export const derated = (name: string, board: Derating["board"]): Derating => ({
  family: family(name),
  typicalAt: { volts: 5, loadPf: 15 },
  limitsAt: { volts: 4.5, loadPf: 50 },
  board,
});
