import type { Metadata } from "next";
import { notFound } from "next/navigation";
import { UnitPlace } from "@/components/traveler/UnitPlace";
import { can } from "@/lib/access/permissions";
import { definePage } from "@/lib/actions/define-page";
import { VOID_WINDOW_MS } from "@/lib/attempt/void-window";
import { loadRevisions } from "@/lib/board/load-revisions";
import { loadMove } from "@/lib/traveler/load-move";
import { loadTraveler } from "@/lib/traveler/load-traveler";
import { editUnit, restoreUnit } from "../../boards/unit-actions";
import { captionEvidence, removeEvidence, restoreEvidence } from "../../evidence/actions";
import * as acts from "./actions";

export async function generateMetadata({ params }: { params: Promise<{ unit: string }> }): Promise<Metadata> {
  return { title: decodeURIComponent((await params).unit) };
}

export default definePage({
  permission: "project.see",
  path: (params) => `/projects/${params.project}/units/${params.unit}`,
  render: async (scope, { params, search }) => {
    const serial = decodeURIComponent(params.unit ?? "");
    const mayMove = !scope.archived && can(scope.role, "procedure.edit");
    const [loaded, move] = await Promise.all([
      loadTraveler(scope, serial),
      mayMove ? loadMove(scope, serial) : undefined,
    ]);
    if (loaded.kind === "missing") notFound();
    const unit = loaded.kind === "none" ? loaded.unit : loaded.traveler;
    const mayEdit = !scope.archived && can(scope.role, "unit.edit");
    const allows = (permission: Parameters<typeof can>[1]) =>
      !scope.archived && !unit.unit.archived && can(scope.role, permission);
    return (
      <UnitPlace
        unit={unit}
        traveler={loaded.kind === "traveler" ? loaded.traveler : undefined}
        move={move}
        openCheck={typeof search.check === "string" ? search.check : undefined}
        revisions={mayEdit && !unit.unit.archived ? await loadRevisions(scope, unit.board.id) : []}
        canEditUnit={mayEdit}
        unitActs={{ edit: editUnit, restore: restoreUnit }}
        frame={{
          project: scope.slug,
          serial: unit.unit.serial,
          viewerId: scope.viewer.userId,
          zone: scope.viewer.timeZone,
          rule: scope.decisionRule,
          voidWindowMs: VOID_WINDOW_MS,
          may: {
            record: allows("attempt.record"),
            attach: allows("evidence.attach"),
            reopen: allows("check.reopen"),
            concede: allows("concession.grant"),
            lift: allows("hold.lift"),
            voidOwn: allows("attempt.void-own"),
            voidAny: allows("attempt.void-any"),
            prerequisites: allows("prerequisite.edit"),
            move: allows("procedure.edit"),
            fault: allows("fault.write"),
            rework: allows("rework.record"),
          },
          acts: {
            reopen: acts.reopenCheck,
            concede: acts.grantConcession,
            withdraw: acts.withdrawConcession,
            lift: acts.liftHold,
            void: acts.voidAttempt,
            addPrerequisite: acts.addPrerequisite,
            removePrerequisite: acts.removePrerequisite,
            move: acts.moveTraveler,
            evidence: { caption: captionEvidence, remove: removeEvidence, restore: restoreEvidence },
          },
        }}
      />
    );
  },
});
