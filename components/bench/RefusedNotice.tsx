import { Notice } from "@/components/ui/Notice";
import { BenchButton } from "./BenchButton";
import type { HeldAttempt } from "./queue/held-attempt";

type Props = { attempt: HeldAttempt; onRetry: () => void; onDiscard: () => void };

/** An attempt of this check that the server refused. What was typed stands in the form again; recording anew replaces it. */
export function RefusedNotice({ attempt, onRetry, onDiscard }: Props) {
  const fields = Object.values(attempt.trouble?.fields ?? {}).filter(
    (sentence) => sentence !== attempt.trouble?.sentence,
  );
  return (
    <Notice
      kind="failed"
      title={`Not recorded: ${attempt.summary}`}
      actions={
        <>
          <BenchButton size="md" onClick={onRetry}>
            Send again
          </BenchButton>
          <BenchButton size="md" kind="failed" onClick={onDiscard}>
            Discard
          </BenchButton>
        </>
      }
    >
      <p>{attempt.trouble?.sentence}</p>
      {fields.map((sentence) => (
        <p key={sentence}>{sentence}</p>
      ))}
      <p className="text-ink-soft text-sm">
        What you entered is in the form again. Change it and record, or discard it.
      </p>
    </Notice>
  );
}
