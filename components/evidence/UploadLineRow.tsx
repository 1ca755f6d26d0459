"use client";

import clsx from "clsx";
import { IconButton } from "@/components/ui/IconButton";
import { Button } from "@/components/ui/Button";
import { sizeText } from "@/lib/storage/limits";
import type { UploadLine } from "./use-uploads";

type Props = { line: UploadLine; onCancel: () => void; onRetry: () => void };

/** One file on its way: name, size, how far it is; when refused, why, and what one can do. */
export function UploadLineRow({ line, onCancel, onRetry }: Props) {
  const failed = line.state === "failed";
  // All bytes are there: the server is looking at them, and cancelling could no longer promise that nothing is kept.
  const checking = line.state === "sending" && line.progress >= 1;
  const percent = Math.round(line.progress * 100);
  return (
    <li
      className={clsx("rounded border px-3 py-2", failed ? "border-failed bg-failed-ground" : "border-rule bg-sheet")}
    >
      <div className="flex items-center gap-3">
        <span className="min-w-0 flex-1 truncate text-sm font-semibold">{line.file.name}</span>
        <span className="mono shrink-0 text-xs text-ink-soft">
          {failed ? sizeText(line.file.size) : stateText(line, percent)}
        </span>
        {failed && line.canRetry && (
          <Button size="sm" onPress={onRetry}>
            Retry
          </Button>
        )}
        {!checking && (
          <IconButton
            size="sm"
            icon="close"
            label={failed ? `Dismiss ${line.file.name}` : `Cancel ${line.file.name}`}
            onPress={onCancel}
          />
        )}
      </div>
      {failed ? (
        <p className="mt-1 text-sm font-medium text-failed">{line.message}</p>
      ) : (
        <div
          role="progressbar"
          aria-label={`Sending ${line.file.name}`}
          aria-valuenow={percent}
          aria-valuemin={0}
          aria-valuemax={100}
          className="mt-1.5 h-1.5 overflow-hidden rounded-sm bg-rule"
        >
          <div
            className="h-full origin-left bg-copper transition-transform duration-150"
            style={{ transform: `scaleX(${line.progress})` }}
          />
        </div>
      )}
    </li>
  );
}

function stateText(line: UploadLine, percent: number): string {
  if (line.state === "waiting") return "waits its turn";
  return line.progress >= 1 ? "being checked" : `${percent} % of ${sizeText(line.file.size)}`;
}
