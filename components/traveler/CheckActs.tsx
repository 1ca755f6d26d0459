"use client";

import { Button } from "@/components/ui/Button";
import { ButtonLink } from "@/components/ui/ButtonLink";
import type { CheckView } from "@/lib/traveler/traveler-view";
import { ReasonDialog } from "./ReasonDialog";
import type { TravelerFrame } from "./traveler-acts";

type Props = { check: CheckView; frame: TravelerFrame };

/** A maintainer's decisions about this check; only those that its state allows. */
export function CheckActs({ check, frame }: Props) {
  const { may, acts, project } = frame;
  const on = (writeId: string) => ({ project, writeId, checkId: check.id });
  const lastValid = check.attempts.find((attempt) => !attempt.voided);
  const standing = check.concessions.find((concession) => !concession.withdrawn);
  const open = check.state !== "passed" && check.state !== "conceded";
  const buttons = [
    may.reopen && lastValid && check.state !== "reopened" && (
      <ReasonDialog
        key="reopen"
        title={`Reopen “${check.title}”?`}
        trigger={<Button>Reopen</Button>}
        explanation="The check must be repeated. Its attempts stay, and what depends on it waits again. The builder who did it last is told."
        label="Why it is to be repeated, and how"
        submitLabel="Reopen the check"
        said="Reopened. It asks to be repeated."
        send={(reason, writeId) => acts.reopen({ ...on(writeId), reason })}
      />
    ),
    may.concede && check.state === "failed" && lastValid && (
      <ReasonDialog
        key="concede"
        title={`Accept “${check.title}” as it is?`}
        trigger={<Button>Concede</Button>}
        explanation={`The last attempt (${lastValid.summary}) does not conform. With a concession the check holds, the reason stays on the traveler, and it goes on the punch list.`}
        label="Why it is accepted though it does not conform"
        submitLabel="Grant the concession"
        said="Conceded. The check holds."
        send={(reason, writeId) => acts.concede({ ...on(writeId), attemptId: lastValid.id, reason })}
      />
    ),
    may.concede && standing && (
      <ReasonDialog
        key="withdraw"
        title="Withdraw the concession?"
        trigger={<Button>Withdraw the concession</Button>}
        explanation="The check fails again, and what depends on it waits. The concession and its withdrawal stay on the traveler."
        label="Why it is no longer accepted"
        submitLabel="Withdraw it"
        said="Withdrawn. The check fails again."
        send={(reason, writeId) => acts.withdraw({ project, writeId, concessionId: standing.id, reason })}
      />
    ),
    may.lift && check.holdPoint && open && check.holdLifts.length === 0 && (
      <ReasonDialog
        key="lift"
        title={`Lift the hold of “${check.title}”?`}
        trigger={<Button kind="danger">Lift the hold</Button>}
        explanation="The checks after it can then be recorded on this unit although it does not hold. A hold point is there to protect people and boards. The reason is shown on the traveler for ever."
        label="Why this unit may go on"
        submitLabel="Lift the hold for this unit"
        said="Lifted for this unit. The reason stands on the traveler."
        send={(reason, writeId) => acts.lift({ ...on(writeId), reason })}
      />
    ),
    may.fault && check.state === "failed" && (
      <ButtonLink
        key="fault"
        href={`/projects/${project}/faults/new?unit=${encodeURIComponent(frame.serial)}&check=${check.id}`}
        prefetch={false}
      >
        Make a fault
      </ButtonLink>
    ),
  ].filter(Boolean);
  return buttons.length > 0 ? <div className="flex flex-wrap gap-2">{buttons}</div> : null;
}
