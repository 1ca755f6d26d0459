import { Page } from "@/components/shell/Page";
import { ButtonLink } from "@/components/ui/ButtonLink";
import { DateTime } from "@/components/ui/DateTime";
import { LinkTabs } from "@/components/ui/LinkTabs";
import { Panel } from "@/components/ui/Panel";
import type { CheckRow } from "@/lib/procedure/check-row";
import type { ProcedureView, VersionLine } from "@/lib/procedure/load-procedure";
import type { Difference } from "@/lib/traveler/compare-versions";
import { DifferenceSheet } from "./DifferenceSheet";
import { VersionSheet } from "./VersionSheet";

type Props = {
  project: string;
  zone: string;
  view: ProcedureView;
  version: VersionLine;
  checks: CheckRow[];
  compared: { number: number; difference: Difference } | undefined;
};

/** One issued version, and what it has different from another. */
export function VersionPlace({ project, zone, view, version, checks, compared }: Props) {
  const base = `/projects/${project}/boards/${view.board.code}/procedure`;
  const others = view.versions.filter((one) => one.number !== version.number);
  return (
    <Page
      title={`Procedure of ${view.board.name}, version ${version.number}`}
      lede={
        <>
          Issued <DateTime at={version.issuedAt} zone={zone} />. {version.note}
        </>
      }
      actions={<ButtonLink href={base}>Newest</ButtonLink>}
    >
      <div className="flex flex-col gap-5">
        {others.length > 0 && (
          <Panel title="Differences">
            <LinkTabs
              label="Compare with"
              tabs={others.map((one) => ({
                href: `${base}/${version.number}?with=${one.number}`,
                label: `Against version ${one.number}`,
                isCurrent: compared?.number === one.number,
              }))}
            />
            <div className="pt-3">
              {compared ? (
                <DifferenceSheet difference={compared.difference} />
              ) : (
                <p className="text-sm text-ink-soft">Choose a version to compare with.</p>
              )}
            </div>
          </Panel>
        )}
        <VersionSheet checks={checks} />
      </div>
    </Page>
  );
}
