import type { Metadata } from "next";
import { notFound } from "next/navigation";
import { LidSheet } from "@/components/rework/LidSheet";
import { definePage } from "@/lib/actions/define-page";
import { env } from "@/lib/env";
import { loadReworks } from "@/lib/rework/load-reworks";
import { qrCodes } from "@/lib/traveler/qr-codes";

export async function generateMetadata({ params }: { params: Promise<{ unit: string }> }): Promise<Metadata> {
  return { title: `Lid sheet ${decodeURIComponent((await params).unit)}` };
}

export default definePage({
  permission: "project.see",
  path: (params) => `/projects/${params.project}/units/${params.unit}/reworks/print`,
  render: async (scope, { params }) => {
    const view = await loadReworks(scope, decodeURIComponent(params.unit ?? ""));
    if (!view) notFound();
    const back = `/projects/${scope.slug}/units/${encodeURIComponent(view.unit.serial)}/reworks`;
    const codes = await qrCodes([["list", `${env().APP_URL.replace(/\/$/, "")}${back}`]]);
    return (
      <LidSheet
        project={scope.projectName}
        zone={scope.viewer.timeZone}
        view={view}
        back={back}
        code={codes.list}
        printedAt={new Date().toISOString()}
      />
    );
  },
});
