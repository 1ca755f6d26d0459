import type { RackCheck } from "@/db/queries/rack";
import { STAGES } from "@/lib/procedure/stages";
import type { RackBoard, RackUnit } from "./rack-view";

type UnitRow = { id: string; serial: string; revision: string; board: RackBoard };

/** One unit as the rack shows it: its five strips, what they add up to, and which of its checks is next. */
export function buildUnit(unit: UnitRow, checks: readonly RackCheck[], nextIds: readonly string[]): RackUnit {
  const byStage = STAGES.map(({ id }) => checks.filter((check) => check.stage === id));
  const count = (...states: string[]) => checks.filter((check) => states.includes(check.state)).length;
  const first = nextIds.find((id) => checks.some((check) => check.id === id));
  const group = byStage.findIndex((stage) => stage.some((check) => check.id === first));
  const check = byStage[group]?.findIndex((entry) => entry.id === first) ?? -1;
  return {
    ...unit,
    stages: STAGES.map(({ id }, index) => ({ stage: id, states: byStage[index]?.map((entry) => entry.state) ?? [] })),
    total: checks.length,
    holding: count("passed", "conceded"),
    failing: count("failed"),
    doubtful: count("doubtful"),
    reopened: count("reopened"),
    marked: group < 0 ? null : { group, check },
  };
}
