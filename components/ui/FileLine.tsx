"use client";

import { IconButton } from "./IconButton";
import { ProgressBar } from "./ProgressBar";

export type FileLineProps = {
  name: string;
  /** "2.4 MB" */
  size: string;
  progress: { state: "waiting" | "done" } | { state: "sending"; share: number } | { state: "failed"; reason: string };
  onCancel?: () => void;
  onRetry?: () => void;
};

/** One file on its way: how far, stop it, try again. */
export function FileLine({ name, size, progress, onCancel, onRetry }: FileLineProps) {
  return (
    <div className="flex items-center gap-3 border-b border-rule py-2 last:border-b-0">
      <div className="min-w-0 flex-1">
        <p className="flex items-baseline gap-2.5">
          <span className="truncate">{name}</span>
          <span className="mono shrink-0 text-xs text-ink-soft">{size}</span>
        </p>
        {progress.state === "sending" && (
          <ProgressBar label={`Sending ${name}`} isLabelHidden value={progress.share} className="mt-1.5" />
        )}
        {progress.state === "waiting" && <p className="text-sm text-ink-soft">Waits its turn</p>}
        {progress.state === "done" && <p className="text-sm text-passed">Arrived</p>}
        {progress.state === "failed" && (
          <p role="alert" className="text-sm font-medium text-failed">
            {progress.reason}
          </p>
        )}
      </div>
      {progress.state === "failed" && onRetry && (
        <IconButton icon="undo" label={`Try ${name} again`} onPress={onRetry} />
      )}
      {progress.state !== "done" && onCancel && (
        <IconButton icon="close" label={`Leave ${name} out`} onPress={onCancel} />
      )}
    </div>
  );
}
