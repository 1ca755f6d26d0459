import type { Metadata } from "next";
import { notFound } from "next/navigation";
import { VersionPlace } from "@/components/procedure/VersionPlace";
import { definePage } from "@/lib/actions/define-page";
import { loadProcedure, loadVersion } from "@/lib/procedure/load-procedure";
import { compareVersions } from "@/lib/traveler/compare-versions";

export async function generateMetadata({ params }: { params: Promise<{ number: string }> }): Promise<Metadata> {
  return { title: `Procedure version ${(await params).number}` };
}

/** `?with=2` names the version it is compared with; without it the one before. */
export default definePage({
  permission: "project.see",
  path: (params) => `/projects/${params.project}/boards/${params.board}/procedure/${params.number}`,
  render: async (scope, { params, search }) => {
    const { board = "", number = "" } = params;
    const [view, checks] = await Promise.all([loadProcedure(scope, board), loadVersion(scope, board, Number(number))]);
    const version = view?.versions.find((one) => String(one.number) === number);
    if (!view || !version || !checks) notFound();
    const other = typeof search.with === "string" ? Number(search.with) : version.number - 1;
    const compared = other === version.number ? undefined : await loadVersion(scope, board, other);
    return (
      <VersionPlace
        project={scope.slug}
        zone={scope.viewer.timeZone}
        view={view}
        version={version}
        checks={checks}
        compared={compared ? { number: other, difference: compareVersions(compared, checks) } : undefined}
      />
    );
  },
});
