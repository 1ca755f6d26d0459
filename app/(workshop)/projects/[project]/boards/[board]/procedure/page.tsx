import type { Metadata } from "next";
import { notFound } from "next/navigation";
import { ProcedurePlace } from "@/components/procedure/ProcedurePlace";
import { can } from "@/lib/access/permissions";
import { definePage } from "@/lib/actions/define-page";
import { loadProcedure } from "@/lib/procedure/load-procedure";
import { STARTERS } from "@/lib/procedure/starters/list";
import { STARTER_IDS } from "@/lib/procedure/starters/starter-ids";
import { loadMove } from "@/lib/traveler/load-move";
import { moveTraveler } from "../../../units/[unit]/actions";
import { deleteCheck, discardDraft, issueProcedure, reorderChecks, saveCheck, startDraft } from "./actions";

export const metadata: Metadata = { title: "Procedure" };

export default definePage({
  permission: "project.see",
  path: (params) => `/projects/${params.project}/boards/${params.board}/procedure`,
  render: async (scope, { params }) => {
    const view = await loadProcedure(scope, params.board ?? "");
    if (!view) notFound();
    const canEdit = !scope.archived && can(scope.role, "procedure.edit");
    const moves = canEdit ? await Promise.all(view.behind.map(({ serial }) => loadMove(scope, serial))) : [];
    return (
      <ProcedurePlace
        project={scope.slug}
        zone={scope.viewer.timeZone}
        view={view}
        moves={moves.filter((move) => move !== undefined)}
        starters={STARTER_IDS.map((id) => ({
          id,
          name: STARTERS[id].name,
          description: STARTERS[id].description,
          checks: STARTERS[id].checks.length,
        }))}
        canEdit={canEdit}
        acts={{
          start: startDraft,
          save: saveCheck,
          remove: deleteCheck,
          reorder: reorderChecks,
          discard: discardDraft,
          issue: issueProcedure,
          move: moveTraveler,
        }}
      />
    );
  },
});
