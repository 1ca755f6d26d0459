"use client";

import { useCallback } from "react";
import { FileDrop } from "@/components/ui/FileDrop";
import { FileLine, type FileLineProps } from "@/components/ui/FileLine";
import type { AttachmentKind } from "@/db/schema/evidence";
import type { EvidenceTarget } from "@/lib/attachment/schema";
import { ACCEPT, limitsText, sizeText } from "@/lib/storage/limits";
import type { EvidenceView } from "@/lib/traveler/traveler-view";
import { useUploads, type UploadLine } from "./use-uploads";

export type EvidencePickerProps = {
  /** Slug of the project. */
  project: string;
  target: EvidenceTarget;
  /** What is wanted here. A picture becomes the first kind of picture among them. */
  kinds: AttachmentKind[];
  /** Called once for each file that the server keeps. */
  onUploaded: (evidence: EvidenceView) => void;
  /** True while files are on their way. */
  onBusy?: (busy: boolean) => void;
  /** Larger touch targets, for hands with flux on them. */
  size?: "md" | "bench";
  className?: string;
};

/** Camera, file dialog, drop and paste; several at once, each with progress, cancel and retry. */
export function EvidencePicker({
  project,
  target,
  kinds,
  onUploaded,
  onBusy,
  size = "md",
  className,
}: EvidencePickerProps) {
  const { lines, notice, add, cancel, retry } = useUploads({ project, target, kinds, onUploaded, onBusy });
  const take = useCallback((files: File[]) => add(files), [add]);
  return (
    <div className={className}>
      <FileDrop
        label={labelOf(kinds)}
        hint={limitsText(kinds)}
        accept={kinds.flatMap((kind) => ACCEPT[kind].split(","))}
        hasCamera={kinds.some((kind) => kind !== "scope-data")}
        onFiles={take}
        size={size}
        className="print:hidden"
      />
      <div aria-live="polite">
        {notice !== "" && <p className="mt-2 text-sm text-ink-soft">{notice}</p>}
        {lines.map((line) => (
          <FileLine
            key={line.uploadId}
            name={line.file.name}
            size={isChecking(line) ? `${sizeText(line.file.size)}, being checked` : sizeText(line.file.size)}
            progress={progressOf(line)}
            {...(isChecking(line) ? {} : { onCancel: () => cancel(line.uploadId) })}
            {...(line.canRetry ? { onRetry: () => retry(line.uploadId) } : {})}
          />
        ))}
      </div>
    </div>
  );
}

/** All bytes are there: cancelling could no longer promise that nothing is kept. */
const isChecking = (line: UploadLine) => line.state === "sending" && line.progress >= 1;

function progressOf(line: UploadLine): FileLineProps["progress"] {
  if (line.state === "failed") return { state: "failed", reason: line.message };
  return line.state === "waiting" ? { state: "waiting" } : { state: "sending", share: line.progress };
}

const NOUNS: Record<AttachmentKind, string> = {
  photo: "photos",
  "scope-picture": "scope pictures",
  "scope-data": "scope data",
};

function labelOf(kinds: readonly AttachmentKind[]): string {
  const words = kinds.map((kind) => NOUNS[kind]);
  const last = words.pop() ?? "files";
  return words.length === 0 ? `Add ${last}` : `Add ${words.join(", ")} or ${last}`;
}
