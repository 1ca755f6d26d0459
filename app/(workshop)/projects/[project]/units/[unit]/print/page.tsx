import type { Metadata } from "next";
import { notFound } from "next/navigation";
import { BenchSheet } from "@/components/traveler/BenchSheet";
import { definePage } from "@/lib/actions/define-page";
import { env } from "@/lib/env";
import { loadTraveler } from "@/lib/traveler/load-traveler";
import { qrCodes } from "@/lib/traveler/qr-codes";

export async function generateMetadata({ params }: { params: Promise<{ unit: string }> }): Promise<Metadata> {
  return { title: `Bench sheet ${decodeURIComponent((await params).unit)}` };
}

export default definePage({
  permission: "project.see",
  path: (params) => `/projects/${params.project}/units/${params.unit}/print`,
  render: async (scope, { params }) => {
    const loaded = await loadTraveler(scope, decodeURIComponent(params.unit ?? ""));
    if (loaded.kind !== "traveler") notFound();
    const { traveler } = loaded;
    const base = `${env().APP_URL.replace(/\/$/, "")}/projects/${scope.slug}`;
    const bench = `${base}/bench/${encodeURIComponent(traveler.unit.serial)}`;
    const addresses = traveler.checks.map((check) => [check.id, `${bench}?check=${check.id}`] as const);
    return (
      <BenchSheet
        project={scope.projectName}
        traveler={traveler}
        zone={scope.viewer.timeZone}
        rule={scope.decisionRule}
        back={`/projects/${scope.slug}/units/${encodeURIComponent(traveler.unit.serial)}`}
        codes={await qrCodes(addresses)}
        printedAt={new Date().toISOString()}
      />
    );
  },
});
