import type { CheckHistory } from "./check-history";

const inOrder = (a: CheckHistory, b: CheckHistory) => a.position - b.position || (a.id < b.id ? -1 : 1);

/** The checks of each unit in traveler order. */
export function groupUnits(histories: readonly CheckHistory[]): CheckHistory[][] {
  const units = new Map<string, CheckHistory[]>();
  for (const history of histories) {
    const unit = units.get(history.unitId);
    if (unit) unit.push(history);
    else units.set(history.unitId, [history]);
  }
  return [...units.values()].map((unit) => unit.sort(inOrder));
}
