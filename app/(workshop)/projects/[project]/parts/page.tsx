import type { Metadata } from "next";
import { OrderPlace } from "@/components/parts/OrderPlace";
import { OrderSheet } from "@/components/parts/OrderSheet";
import { can } from "@/lib/access/permissions";
import { definePage } from "@/lib/actions/define-page";
import { loadPartsList } from "@/lib/parts-list/load-parts-list";
import { saveSpares, stockPart } from "./actions";

export const metadata: Metadata = { title: "Parts to order" };

export default definePage({
  permission: "project.see",
  path: (params) => `/projects/${params.project}/parts`,
  render: async (scope, { search }) => {
    const view = await loadPartsList(scope, typeof search.board === "string" ? search.board : null);
    return (
      <>
        <div className="print:hidden">
          <OrderPlace
            project={scope.slug}
            view={view}
            canEdit={!scope.archived && can(scope.role, "parts.edit")}
            acts={{ stock: stockPart, spares: saveSpares }}
          />
        </div>
        <OrderSheet
          projectName={scope.projectName}
          zone={scope.viewer.timeZone}
          printedAt={new Date().toISOString()}
          view={view}
        />
      </>
    );
  },
});
