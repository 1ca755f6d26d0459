import type { Metadata } from "next";
import { notFound } from "next/navigation";
import { BenchScreen } from "@/components/bench/BenchScreen";
import { NoTraveler } from "@/components/bench/NoTraveler";
import { can } from "@/lib/access/permissions";
import { definePage } from "@/lib/actions/define-page";
import { loadInstruments } from "@/lib/instrument/load-instruments";
import { loadTraveler } from "@/lib/traveler/load-traveler";
import { voidSlipAction } from "./actions";

export async function generateMetadata({ params }: { params: Promise<{ unit: string }> }): Promise<Metadata> {
  return { title: `${decodeURIComponent((await params).unit)} on the bench` };
}

export default definePage({
  permission: "project.see",
  path: (params) => `/projects/${params.project}/bench/${params.unit}`,
  render: async (scope, { params, search }) => {
    const serial = decodeURIComponent(params.unit ?? "");
    const [loaded, instruments] = await Promise.all([loadTraveler(scope, serial), loadInstruments(scope)]);
    if (loaded.kind === "missing") notFound();
    if (loaded.kind === "none") return <NoTraveler project={scope.slug} serial={loaded.unit.unit.serial} />;
    const { userId, name, timeZone } = scope.viewer;
    const isOpen = !scope.archived && !loaded.traveler.unit.archived;
    return (
      <BenchScreen
        project={{ slug: scope.slug, name: scope.projectName, rule: scope.decisionRule }}
        viewer={{ id: userId, name, timeZone }}
        may={{
          record: isOpen && can(scope.role, "attempt.record"),
          attach: isOpen && can(scope.role, "evidence.attach"),
        }}
        traveler={loaded.traveler}
        instruments={instruments.filter((one) => !one.isArchived).map(({ id, name, ranges }) => ({ id, name, ranges }))}
        openCheck={typeof search.check === "string" ? search.check : undefined}
        voidAttempt={voidSlipAction}
      />
    );
  },
});
