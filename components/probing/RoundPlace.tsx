import { Page } from "@/components/shell/Page";
import { ButtonLink } from "@/components/ui/ButtonLink";
import { DateTime } from "@/components/ui/DateTime";
import { Notice } from "@/components/ui/Notice";
import { Panel } from "@/components/ui/Panel";
import { counted } from "@/components/workshop/counted";
import type { RoundPage } from "@/lib/probing/load-round-page";
import { AnswersPanel } from "./AnswersPanel";
import { AskAgain, type AskAct } from "./AskAgain";
import { CloseRound, type CloseAct } from "./CloseRound";
import { FindingList } from "./FindingList";
import { PlanFigures } from "./PlanFigures";

type Props = RoundPage & {
  project: string;
  zone: string;
  may: { probe: boolean; fault: boolean };
  acts: { ask: AskAct; close: CloseAct };
};

/** One round: what it found so far, every answer, and its end. */
export function RoundPlace({ project, zone, may, acts, ...page }: Props) {
  const { round, report, said } = page;
  const { unit, board, netlist, about, startedAt, closedAt } = round;
  const isOpen = closedAt === null;
  const self = `/projects/${project}/units/${encodeURIComponent(unit.serial)}`;
  return (
    <Page
      title={
        <>
          {unit.serial}{" "}
          <span className="font-normal text-ink-soft">
            round of <DateTime at={startedAt} zone={zone} form="short" />
          </span>
        </>
      }
      lede={`${board.name}, netlist ${netlist.letter} ${netlist.number}: ${about}; ${round.limits.words}.`}
      actions={
        <>
          <ButtonLink href={`${self}/probing`}>All rounds</ButtonLink>
          {isOpen && may.probe && (
            <ButtonLink kind="primary" href={`/projects/${project}/probe/${round.id}`} prefetch={false}>
              Go on probing
            </ButtonLink>
          )}
        </>
      }
      aside={
        <>
          {isOpen && may.probe && <CloseRound page={page} project={project} close={acts.close} />}
          {closedAt && (
            <Notice
              kind="info"
              actions={
                round.checkId &&
                round.attemptId && <ButtonLink href={`${self}?check=${round.checkId}`}>See the attempt</ButtonLink>
              }
            >
              Closed <DateTime at={closedAt} zone={zone} />.
            </Notice>
          )}
          <Panel title="The plan">
            <PlanFigures figures={round.figures} count={round.probes.length} />
          </Panel>
        </>
      }
    >
      {isOpen && may.probe && page.followUps > 0 && (
        <AskAgain project={project} plan={round.id} count={page.followUps} ask={acts.ask} />
      )}
      <Panel title="What it comes to" note={said}>
        {report.findings.length === 0 ? (
          <p className="text-[0.9375rem] text-ink-soft">
            {round.results.length === 0
              ? "Nothing was probed yet. Findings appear here as soon as an answer is not what the netlist says."
              : "Every answer so far is what the netlist says."}
          </p>
        ) : (
          <FindingList findings={report.findings} round={round} project={project} mayFault={may.fault} />
        )}
        {(report.remarks.length > 0 || report.repeat.length > 0) && (
          <ul className="mt-4 max-w-prose list-disc pl-5 text-sm text-ink-soft">
            {report.remarks.map((remark) => (
              <li key={remark}>{remark}</li>
            ))}
            {report.repeat.length > 0 && (
              <li>
                {counted(report.repeat.length, "silent probe speaks", "silent probes speak")} only for a piece of an
                open net: probe again after mending.
              </li>
            )}
          </ul>
        )}
      </Panel>
      <AnswersPanel round={round} />
    </Page>
  );
}
