import type { EvidenceActions } from "@/components/evidence/use-evidence-acts";
import { Page } from "@/components/shell/Page";
import { ButtonLink } from "@/components/ui/ButtonLink";
import { EmptyState } from "@/components/ui/EmptyState";
import { Panel } from "@/components/ui/Panel";
import type { ReworkComparison, ReworksView } from "@/lib/rework/load-reworks";
import { CompareReworks } from "./CompareReworks";
import { ReworkCard } from "./ReworkCard";
import { WireDrawing } from "./WireDrawing";
import { wiresOf, WireTable } from "./WireTable";

type Props = {
  project: string;
  zone: string;
  view: ReworksView;
  comparison: ReworkComparison | undefined;
  canRecord: boolean;
  evidence: EvidenceActions | undefined;
};

/** Everything that was changed on one unit since it was built. */
export function ReworksPlace({ project, zone, view, comparison, canRecord, evidence }: Props) {
  const { serial, archived } = view.unit;
  const self = `/projects/${project}/units/${encodeURIComponent(serial)}`;
  const wires = wiresOf(view.reworks);
  const mayRecord = canRecord && !archived;
  const record = (
    <ButtonLink kind="primary" href={`${self}/reworks/new`} prefetch={false}>
      Record a rework
    </ButtonLink>
  );
  return (
    <Page
      title={
        <>
          Reworks of <span className="whitespace-nowrap">{serial}</span>{" "}
          <span className="text-ink-soft font-normal">
            {view.board.name}, rev {view.revision}
          </span>
        </>
      }
      lede={lede(view.reworks.length, wires.length)}
      actions={
        <>
          <ButtonLink href={self}>To the traveler</ButtonLink>
          {wires.length > 0 && (
            <ButtonLink href={`${self}/reworks/print`} prefetch={false}>
              Print the lid sheet
            </ButtonLink>
          )}
          {mayRecord && record}
        </>
      }
      aside={
        view.others.length > 0 ? (
          <CompareReworks {...{ project, serial, comparison }} others={view.others} />
        ) : undefined
      }
    >
      <div className="flex flex-col gap-5">
        {wires.length > 0 && (
          <Panel title="Bodge wires" note={String(wires.length)}>
            <div className="grid gap-4">
              <WireTable wires={wires} />
              <WireDrawing connectors={view.connectors} wires={wires.map(({ wire }) => wire)} />
            </div>
          </Panel>
        )}
        {view.reworks.length === 0 ? (
          <EmptyState title="As it came from the iron" action={mayRecord && record}>
            Nothing was reworked on {serial}. A bodge wire, a cut track, a swapped part, a reflow, another table: each
            is written down here, and what it touches is repeated.
          </EmptyState>
        ) : (
          <section aria-label="All reworks" className="border-rule bg-sheet divide-rule divide-y rounded-lg border">
            {view.reworks.map((rework, index) => (
              <ReworkCard
                key={rework.id}
                {...{ project, zone, serial, rework, evidence }}
                isNewest={index === 0}
                others={canRecord ? view.others.map((other) => other.serial) : []}
              />
            ))}
          </section>
        )}
      </div>
    </Page>
  );
}

function lede(reworks: number, wires: number): string {
  if (reworks === 0) return "Nothing was changed since it was built.";
  const first = `${reworks} ${reworks === 1 ? "rework" : "reworks"} since it was built`;
  return wires === 0 ? `${first}.` : `${first}; ${wires} bodge ${wires === 1 ? "wire is" : "wires are"} in.`;
}
