import { Page } from "@/components/shell/Page";
import { ButtonLink } from "@/components/ui/ButtonLink";
import { EmptyState } from "@/components/ui/EmptyState";
import { LinkTabs } from "@/components/ui/LinkTabs";
import type { EvidenceActions } from "@/components/evidence/use-evidence-acts";
import type { AttachmentKind } from "@/db/schema/evidence";
import { capturesAddress } from "@/lib/attachment/captures-address";
import type { CapturesQuery, CapturesView } from "@/lib/attachment/load-captures";
import { AddCaptures } from "./AddCaptures";
import { CapturePages } from "./CapturePages";
import { CaptureWall } from "./CaptureWall";
import { UnitFilter } from "./UnitFilter";

type Props = {
  project: string;
  zone: string;
  query: CapturesQuery;
  view: CapturesView;
  canAttach: boolean;
  actions: EvidenceActions | undefined;
};

const TABS: { kind: AttachmentKind; label: string }[] = [
  { kind: "scope-picture", label: "Scope pictures" },
  { kind: "scope-data", label: "Scope data" },
  { kind: "photo", label: "Photos" },
];

const EMPTY: Record<AttachmentKind, { title: string; text: string }> = {
  "scope-picture": {
    title: "No scope pictures yet",
    text: "Pictures saved by a scope come here: attach them to a check on the bench, or add them here.",
  },
  "scope-data": {
    title: "No scope data yet",
    text: "Samples that a scope saves as text (CSV, TSV) come here as they are: attach them to a check on the bench, or add them here.",
  },
  photo: {
    title: "No photos yet",
    text: "Photos of boards and set-ups come here: take them at a check on the bench, in a log entry, or add them here.",
  },
};

/** Everything the scope and the camera saw, by kind, newest first. */
export function CapturesPlace({ project, zone, query, view, canAttach, actions }: Props) {
  const { unit, kind } = query;
  const empty = EMPTY[kind];
  return (
    <Page
      title="Captures"
      lede="Scope pictures, scope data and photos, each with the unit and the check it belongs to."
      actions={canAttach && <AddCaptures project={project} kind={kind} />}
    >
      <div className="flex flex-col gap-4">
        <div className="flex flex-wrap items-end justify-between gap-x-6 gap-y-3">
          <LinkTabs
            label="Kinds of capture"
            className="flex-1"
            tabs={TABS.map((tab) => ({
              href: capturesAddress(project, { kind: tab.kind, unit }),
              label: tab.label,
              isCurrent: tab.kind === kind,
              count: view.counts[tab.kind],
            }))}
          />
          {view.units.length > 0 && <UnitFilter project={project} query={query} units={view.units} />}
        </div>
        {view.captures.length === 0 ? (
          <EmptyState
            title={unit ? `None of ${unit}` : empty.title}
            action={unit && <ButtonLink href={capturesAddress(project, { kind })}>Show all units</ButtonLink>}
          >
            {empty.text}
          </EmptyState>
        ) : (
          <CaptureWall {...{ project, zone, actions }} captures={view.captures} />
        )}
        {view.pages > 1 && <CapturePages project={project} query={query} view={view} />}
      </div>
    </Page>
  );
}
