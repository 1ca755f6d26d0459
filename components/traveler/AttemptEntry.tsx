"use client";

import { EvidenceGallery } from "@/components/evidence/EvidenceGallery";
import { Button } from "@/components/ui/Button";
import { DateTime } from "@/components/ui/DateTime";
import { checkKind } from "@/lib/check-kinds/list";
import type { AttemptView, CheckView } from "@/lib/traveler/traveler-view";
import { ReasonDialog } from "./ReasonDialog";
import type { TravelerFrame } from "./traveler-acts";
import { useMayStillVoid } from "./use-may-still-void";

type Props = { attempt: AttemptView; check: CheckView; frame: TravelerFrame };

/** One carrying-out: the record, the judgement in the words it was given, who, with what, and its evidence. */
export function AttemptEntry({ attempt, check, frame }: Props) {
  const { RecordView } = checkKind(check.kind);
  const { voided } = attempt;
  return (
    <article className="grid gap-1.5">
      <div className={voided ? "line-through decoration-2 opacity-75" : undefined}>
        <RecordView spec={check.spec} record={attempt.record} readings={attempt.readings} rule={frame.rule} />
      </div>
      {voided && (
        <p className="text-failed text-sm font-semibold">
          Voided by {voided.by.name}, <DateTime at={voided.at} zone={frame.zone} form="short" />: {voided.reason}
        </p>
      )}
      {attempt.sentences.map((sentence) => (
        <p key={sentence} className="text-ink-soft text-sm">
          {sentence}
        </p>
      ))}
      {attempt.note && <p className="whitespace-pre-line">{attempt.note}</p>}
      <p className="text-ink-soft text-sm">
        {attempt.by.name}, <DateTime at={attempt.performedAt} zone={frame.zone} />
        {attempt.instrument && `, with ${attempt.instrument}`}
        {uncertainty(attempt)}
        <Late attempt={attempt} zone={frame.zone} />
      </p>
      <EvidenceGallery
        project={frame.project}
        evidence={attempt.evidence}
        zone={frame.zone}
        form="strip"
        {...(frame.may.attach ? { actions: frame.acts.evidence } : {})}
      />
      {!voided && <VoidButton attempt={attempt} frame={frame} />}
    </article>
  );
}

/** U of a single reading; a table says it cell by cell in its sentences. */
function uncertainty({ readings }: AttemptView): string {
  const [reading, ...rest] = readings;
  if (!reading || rest.length > 0 || reading.expandedUncertainty === null) return "";
  return `, U = ±${Number(reading.expandedUncertainty.toPrecision(2))} ${reading.unit}`;
}

/** Said when the device held it for a while: it was done then and arrived now. */
function Late({ attempt, zone }: { attempt: AttemptView; zone: string }) {
  const late = Date.parse(attempt.recordedAt) - Date.parse(attempt.performedAt) > 5 * 60_000;
  if (!late) return null;
  return (
    <>
      , arrived <DateTime at={attempt.recordedAt} zone={zone} form="short" />
    </>
  );
}

function VoidButton({ attempt, frame }: { attempt: AttemptView; frame: TravelerFrame }) {
  const own = useMayStillVoid(attempt.by.id === frame.viewerId ? attempt.recordedAt : undefined, frame.voidWindowMs);
  if (!frame.may.voidAny && !(frame.may.voidOwn && own)) return null;
  return (
    <ReasonDialog
      title="Void this attempt?"
      trigger={
        <Button kind="quiet" size="sm" className="justify-self-start">
          Void
        </Button>
      }
      explanation="It stays on the traveler, struck through, and no longer counts. The check stands as it stood before it."
      label="What went wrong with it"
      submitLabel="Void the attempt"
      said="Voided. It stays on the traveler, struck through."
      send={(reason, writeId) => frame.acts.void({ project: frame.project, writeId, attemptId: attempt.id, reason })}
    />
  );
}
