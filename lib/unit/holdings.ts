import type { UnitHoldings } from "@/db/queries/holdings";

export type Holdings = Omit<UnitHoldings, "unitId">;

/** What hangs on several units together. */
export function addHoldings(each: readonly Holdings[]): Holdings {
  const sum = (name: keyof Holdings) => each.reduce((total, one) => total + one[name], 0);
  return {
    checks: sum("checks"),
    attempts: sum("attempts"),
    files: sum("files"),
    faults: sum("faults"),
    reworks: sum("reworks"),
    waitsOfOtherUnits: sum("waitsOfOtherUnits"),
    waitsOfOtherBoards: sum("waitsOfOtherBoards"),
  };
}
