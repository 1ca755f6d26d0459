import { Notice } from "@/components/ui/Notice";
import { BenchButton } from "./BenchButton";
import { BottomSheet } from "./BottomSheet";
import type { HeldAttempt } from "./queue/held-attempt";
import type { QueueState } from "./queue/attempt-queue";

type Props = {
  queue: QueueState;
  signInHref: string;
  onClose: () => void;
  onTryNow: () => void;
  onEdit: (attempt: HeldAttempt) => void;
  onRetry: (attempt: HeldAttempt) => void;
  onDiscard: (attempt: HeldAttempt) => void;
};

/** Everything that has not reached the server, oldest first, each with why and what one can do. */
export function HeldSheet({ queue, signInHref, onClose, onTryNow, onEdit, onRetry, onDiscard }: Props) {
  return (
    <BottomSheet title={`Held on this device (${queue.held.length})`} onClose={onClose}>
      {queue.held.length === 0 && <p>Nothing is held here. Everything you recorded has reached the server.</p>}
      {queue.signedOut && (
        <Notice kind="caution" title="You are signed out" className="mb-3">
          <p>
            What you recorded is kept here and goes out after you sign in again.{" "}
            <a className="link font-semibold" href={signInHref}>
              Sign in
            </a>
          </p>
        </Notice>
      )}
      <ol className="divide-rule divide-y">
        {queue.held.map((attempt) => (
          <li key={attempt.body.id} className="py-3">
            <p className="font-semibold">
              {attempt.serial}: {attempt.checkTitle}
            </p>
            <p>
              <span className="mono">{attempt.summary}</span>
              {attempt.files.length > 0 && <span className="text-ink-soft"> · {attempt.files.length} files</span>}
            </p>
            <p className={attempt.trouble?.kind === "refused" ? "text-failed" : "text-ink-soft"}>
              {queue.sending === attempt.body.id
                ? "On its way now."
                : (attempt.trouble?.sentence ?? "Waits for its turn.")}
            </p>
            {attempt.trouble?.kind === "refused" && (
              <div className="mt-2 flex flex-wrap gap-2">
                <BenchButton size="md" kind="primary" onClick={() => onEdit(attempt)}>
                  Edit
                </BenchButton>
                <BenchButton size="md" onClick={() => onRetry(attempt)}>
                  Send again
                </BenchButton>
                <BenchButton size="md" kind="failed" onClick={() => onDiscard(attempt)}>
                  Discard
                </BenchButton>
              </div>
            )}
          </li>
        ))}
      </ol>
      {queue.held.some((attempt) => attempt.trouble?.kind !== "refused") && (
        <BenchButton className="mt-3 w-full" onClick={onTryNow}>
          Try now
        </BenchButton>
      )}
    </BottomSheet>
  );
}
