"use client";

import { ReasonDialog } from "@/components/traveler/ReasonDialog";
import { Button } from "@/components/ui/Button";
import type { Reply } from "@/components/ui/form/reply";
import type { FindingView } from "@/lib/finding/load-findings";

type Decision = { project: string; writeId: string; key: string; reason: string };
type Send<Input> = (input: Input) => Promise<Reply<{ title: string }>>;

export function AcceptFinding({
  finding,
  project,
  accept,
}: {
  finding: FindingView;
  project: string;
  accept: Send<Decision & { facts: string }>;
}) {
  const { key, facts, title } = finding;
  return (
    <ReasonDialog
      title={`Accept “${title}”?`}
      trigger={
        <Button size="sm" aria-label={`Accept “${title}”`}>
          Accept
        </Button>
      }
      explanation={
        <>
          It no longer counts as open, on the rack and in the weekly e-mail. It stays accepted until its facts change
          (other pins, another family, other figures); then it is open again. Your name and the reason stand beside it.
        </>
      }
      label="Why it may stay as it is"
      submitLabel="Accept the finding"
      said={`“${title}” is accepted until its facts change.`}
      send={(reason, writeId) => accept({ project, writeId, key, facts, reason })}
    />
  );
}

export function WithdrawAcceptance({
  finding,
  project,
  withdraw,
}: {
  finding: FindingView;
  project: string;
  withdraw: Send<Decision>;
}) {
  const { key, title } = finding;
  return (
    <ReasonDialog
      title={`Open “${title}” again?`}
      trigger={
        <Button size="sm" kind="quiet" aria-label={`Open “${title}” again`}>
          Open again
        </Button>
      }
      explanation="It counts as open again. Who accepted it and why stays in the log."
      label="Why it may not stay as it is"
      submitLabel="Open it again"
      said={`“${title}” is open again.`}
      send={(reason, writeId) => withdraw({ project, writeId, key, reason })}
    />
  );
}
