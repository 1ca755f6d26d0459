import Link from "next/link";
import type { UnitActs } from "@/components/board/board-acts";
import { EditUnit } from "@/components/board/EditUnit";
import { RestoreUnit } from "@/components/board/RestoreUnit";
import { Page } from "@/components/shell/Page";
import { Button } from "@/components/ui/Button";
import { ButtonLink } from "@/components/ui/ButtonLink";
import { EmptyState } from "@/components/ui/EmptyState";
import { Notice } from "@/components/ui/Notice";
import type { RevisionChoice } from "@/lib/board/load-revisions";
import type { MoveView } from "@/lib/traveler/load-move";
import type { TravelerView, UnitWithoutTraveler } from "@/lib/traveler/traveler-view";
import { countsSentence } from "./counts-sentence";
import { doubtSentence } from "./doubt-sentence";
import { MoveTraveler } from "./MoveTraveler";
import type { TravelerFrame } from "./traveler-acts";
import { TravelerPlace } from "./TravelerPlace";

type Props = {
  unit: Pick<UnitWithoutTraveler, "unit" | "board" | "revision" | "slot" | "reworks" | "faults">;
  traveler: TravelerView | undefined;
  move: MoveView | undefined;
  openCheck: string | undefined;
  /** What it can have been made from; asked for only when it can be changed. */
  revisions: readonly RevisionChoice[];
  canEditUnit: boolean;
  unitActs: Pick<UnitActs, "edit" | "restore">;
  frame: TravelerFrame;
};

/** One physical board and the document that accompanies it. */
export function UnitPlace({ unit, traveler, move, openCheck, revisions, canEditUnit, unitActs, frame }: Props) {
  const { serial, note, archived } = unit.unit;
  const base = `/projects/${frame.project}`;
  const self = `${base}/units/${encodeURIComponent(serial)}`;
  const newest =
    traveler && traveler.procedure.newestNumber > traveler.procedure.number
      ? traveler.procedure.newestNumber
      : undefined;
  return (
    <Page
      title={
        <>
          {serial}{" "}
          <span className="text-ink-soft font-normal">
            {unit.board.name}, rev {unit.revision.letter}
            {unit.slot ? `, slot ${unit.slot.position}` : ", in no slot"}
          </span>
        </>
      }
      lede={
        traveler &&
        [
          `Traveler, procedure version ${traveler.procedure.number}.`,
          countsSentence(traveler.checks.map((check) => check.state)),
          doubtSentence(traveler.checks, frame.zone),
        ].join(" ")
      }
      actions={
        <>
          {move && frame.may.move && <MoveTraveler project={frame.project} move={move} act={frame.acts.move} />}
          {canEditUnit && !archived && (
            <EditUnit
              project={frame.project}
              unit={{ ...unit.unit, revisionId: unit.revision.id }}
              revisions={revisions}
              edit={unitActs.edit}
              addressOf={`${base}/units`}
              trigger={<Button>Change the unit</Button>}
            />
          )}
          <ButtonLink href={`${self}/probing`} prefetch={false}>
            Probing
          </ButtonLink>
          {traveler && (
            <ButtonLink href={`${self}/print`} prefetch={false}>
              Print the sheet
            </ButtonLink>
          )}
          {frame.may.rework && (
            <ButtonLink href={`${self}/reworks/new`} prefetch={false}>
              Record a rework
            </ButtonLink>
          )}
          {traveler && frame.may.record && (
            <ButtonLink kind="primary" href={`${base}/bench/${encodeURIComponent(serial)}`} prefetch={false}>
              Bench this unit
            </ButtonLink>
          )}
        </>
      }
    >
      <div className="grid gap-4">
        {archived && (
          <Notice
            kind="waiting"
            actions={canEditUnit && <RestoreUnit project={frame.project} unit={unit.unit} restore={unitActs.restore} />}
          >
            This unit is archived. Its traveler can be read; nothing can be recorded on it.
          </Notice>
        )}
        {unit.reworks + unit.faults > 0 && (
          <p className="-mt-2 flex flex-wrap gap-x-5 gap-y-1 print:hidden">
            {unit.reworks > 0 && (
              <Link href={`${self}/reworks`} className="link" prefetch={false}>
                {unit.reworks === 1 ? "1 rework" : `${unit.reworks} reworks`}
              </Link>
            )}
            {unit.faults > 0 && (
              <Link href={`${base}/faults?unit=${encodeURIComponent(serial)}`} className="link" prefetch={false}>
                {unit.faults === 1 ? "1 fault not mended" : `${unit.faults} faults not mended`}
              </Link>
            )}
          </p>
        )}
        {note && <p className="text-ink-soft max-w-prose whitespace-pre-line">{note}</p>}
        {newest !== undefined && !archived && !frame.may.move && (
          <Notice kind="info">Version {newest} of the procedure is out. A maintainer can move this unit over.</Notice>
        )}
        {traveler ? (
          <TravelerPlace traveler={traveler} frame={frame} openCheck={openCheck} />
        ) : (
          <EmptyState
            title="No traveler yet"
            action={
              <ButtonLink href={`${base}/boards/${encodeURIComponent(unit.board.code)}/procedure`}>
                To the procedure
              </ButtonLink>
            }
          >
            The board {unit.board.name} has no issued procedure. When a maintainer issues one, this unit gets its
            traveler.
          </EmptyState>
        )}
      </div>
    </Page>
  );
}
