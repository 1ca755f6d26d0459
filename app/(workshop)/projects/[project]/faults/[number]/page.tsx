import type { Metadata } from "next";
import { notFound } from "next/navigation";
import { FaultPlace } from "@/components/fault/FaultPlace";
import { can, type Permission } from "@/lib/access/permissions";
import { definePage } from "@/lib/actions/define-page";
import { loadBoardFace } from "@/lib/board/load-board-face";
import { loadBoardNames } from "@/lib/board/load-board-names";
import { loadFault } from "@/lib/fault/load-fault";
import { captionEvidence, removeEvidence, restoreEvidence } from "../../evidence/actions";
import { editFault, similarFaults } from "../actions";

export async function generateMetadata({ params }: { params: Promise<{ number: string }> }): Promise<Metadata> {
  return { title: `F${(await params).number}` };
}

export default definePage({
  permission: "project.see",
  path: (params) => `/projects/${params.project}/faults/${params.number}`,
  render: async (scope, { params }) => {
    const number = /^[1-9]\d{0,8}$/.test(params.number ?? "") ? Number(params.number) : undefined;
    const fault = number === undefined ? undefined : await loadFault(scope, number);
    if (!fault) notFound();
    const [face, names] = await Promise.all([
      loadBoardFace(scope, fault.board.id),
      loadBoardNames(scope, fault.board, fault.unit.revisionId),
    ]);
    const may = (permission: Permission) => !scope.archived && can(scope.role, permission);
    return (
      <FaultPlace
        project={scope.slug}
        zone={scope.viewer.timeZone}
        fault={fault}
        face={face}
        names={names}
        can={{ write: may("fault.write"), rework: may("rework.record"), attach: may("evidence.attach") }}
        acts={{ edit: editFault, similar: similarFaults }}
        evidence={{ caption: captionEvidence, remove: removeEvidence, restore: restoreEvidence }}
      />
    );
  },
});
