import type { StandingCheckRow } from "@/db/queries/travelers";
import type { StandingCheck } from "./next-checks";

export function standingFromRow({ unit_id, hold_point, ...row }: StandingCheckRow): StandingCheck {
  return { ...row, unitId: unit_id, holdPoint: hold_point };
}
