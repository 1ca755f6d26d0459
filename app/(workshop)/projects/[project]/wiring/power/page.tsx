import type { Metadata } from "next";
import { PowerPlace } from "@/components/power/PowerPlace";
import { can } from "@/lib/access/permissions";
import { definePage } from "@/lib/actions/define-page";
import { loadOfferPlaces } from "@/lib/offer/load-offer-places";
import { CURRENT_CHECKS } from "@/lib/power/load-first-power";
import { loadPower } from "@/lib/power/load-power";
import { offerToCheck } from "../../boards/[board]/procedure/actions";
import { removePowerLine, removeRail, saveConditions, savePowerLine, saveRail } from "./actions";

export const metadata: Metadata = { title: "Power" };

export default definePage({
  permission: "project.see",
  path: (params) => `/projects/${params.project}/wiring/power`,
  render: async (scope, { search }) => {
    const view = await loadPower(scope);
    const asked = typeof search.board === "string" ? search.board.toUpperCase() : "";
    const board = view.boards.find(({ code }) => code === asked) ?? view.boards.find(({ power }) => power !== null);
    const chosen = board?.code ?? view.boards[0]?.code ?? "";
    const [place] = chosen === "" ? [] : await loadOfferPlaces(scope, { ...CURRENT_CHECKS, board: chosen });
    const open = !scope.archived;
    return (
      <PowerPlace
        {...{ project: scope.slug, view, chosen, place }}
        can={{ edit: open && can(scope.role, "wiring.edit"), editProcedure: open && can(scope.role, "procedure.edit") }}
        acts={{
          saveConditions,
          saveRail,
          removeRail,
          saveLine: savePowerLine,
          removeLine: removePowerLine,
          offer: offerToCheck,
        }}
      />
    );
  },
});
