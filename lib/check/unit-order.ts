type Placed = { id: string; unitId: string; position: number };

const inOrder = (a: Placed, b: Placed) => a.position - b.position || (a.id < b.id ? -1 : 1);

/** The checks of each unit in traveler order. */
export function groupUnits<Check extends Placed>(checks: readonly Check[]): Check[][] {
  const units = new Map<string, Check[]>();
  for (const check of checks) {
    const unit = units.get(check.unitId);
    if (unit) unit.push(check);
    else units.set(check.unitId, [check]);
  }
  return [...units.values()].map((unit) => unit.sort(inOrder));
}
