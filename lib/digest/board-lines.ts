import type { BoardLine } from "@/emails/parts/digest-mail-props";
import { appLink } from "@/lib/mail/app-link";
import { STAGES } from "@/lib/procedure/stages";
import type { ProjectWeek } from "./project-week";

const HOLDS = new Set(["passed", "conceded"]);

/** One line a unit in work: seated ones in slot order, then the rest. */
export function boardLines({ project, slots, boards, checks }: ProjectWeek): BoardLine[] {
  const place = new Map(slots.flatMap((slot) => (slot.unitId === null ? [] : [[slot.unitId, slot.position ?? 0]])));
  const far = Number.MAX_SAFE_INTEGER;
  return boards
    .flatMap(({ board, unitId, serial }) => (unitId === null || serial === null ? [] : [{ board, unitId, serial }]))
    .sort((a, b) => (place.get(a.unitId) ?? far) - (place.get(b.unitId) ?? far))
    .map(({ board, unitId, serial }) => {
      const own = checks.filter((check) => check.unitId === unitId);
      const holding = (list: typeof own) => list.filter((check) => HOLDS.has(check.state)).length;
      const stages = STAGES.flatMap(({ id, name, short }) => {
        const inStage = own.filter((check) => check.stage === id);
        const failing = inStage.filter((check) => check.state === "failed").length;
        return [{ name, short, holding: holding(inStage), total: inStage.length, failing }];
      });
      return {
        serial,
        name: board.name,
        slot: place.get(unitId) ?? null,
        link: appLink(`/projects/${encodeURIComponent(project.slug)}/units/${encodeURIComponent(serial)}`),
        holding: holding(own),
        total: own.length,
        stages,
      };
    });
}
