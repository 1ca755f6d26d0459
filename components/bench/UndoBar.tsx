import { Icon } from "@/components/ui/Icon";
import { VERDICTS } from "@/lib/check-kinds/verdict-word";
import type { Slip } from "./use-slip";

type Props = { slip: Slip; onUndo: () => void; onDismiss: () => void };

/** For some seconds after recording: what was recorded, and a way back. */
export function UndoBar({ slip, onUndo, onDismiss }: Props) {
  const { attempt, state, sentence } = slip;
  const failed = state === "failed";
  return (
    <div
      role="status"
      className={`motion-appear flex items-center gap-3 border-t px-4 py-1 text-sm ${failed ? "border-failed bg-failed-ground text-failed" : "border-rule bg-mask text-mask-ink"}`}
    >
      <p className="min-w-0 flex-1 leading-tight">
        {failed ? (
          sentence
        ) : (
          <>
            <span className="block truncate">{attempt.checkTitle}</span>
            <span className="font-semibold">
              {attempt.summary}
              {attempt.summary !== VERDICTS[attempt.foreseen].word && `: ${VERDICTS[attempt.foreseen].word}`}
            </span>
          </>
        )}
      </p>
      <button
        type="button"
        disabled={state === "undoing"}
        onClick={failed ? onDismiss : onUndo}
        className="flex min-h-12 shrink-0 items-center gap-2 px-3 text-base font-semibold"
      >
        {!failed && <Icon name="undo" />}
        {failed ? "Close" : state === "undoing" ? "Taking it back" : "Undo"}
      </button>
    </div>
  );
}
