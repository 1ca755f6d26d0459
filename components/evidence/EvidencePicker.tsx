"use client";

import clsx from "clsx";
import { useId, useRef, useState, type ClipboardEvent, type DragEvent } from "react";
import { Button } from "@/components/ui/Button";
import { Icon } from "@/components/ui/Icon";
import type { AttachmentKind } from "@/db/schema/evidence";
import type { EvidenceTarget } from "@/lib/attachment/schema";
import { ACCEPT, limitsText } from "@/lib/storage/limits";
import type { EvidenceView } from "@/lib/traveler/traveler-view";
import { UploadLineRow } from "./UploadLineRow";
import { useUploads } from "./use-uploads";

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
  const [over, setOver] = useState(false);
  const camera = useRef<HTMLInputElement>(null);
  const dialog = useRef<HTMLInputElement>(null);
  const hint = useId();
  const pictures = kinds.some((kind) => kind !== "scope-data");

  const take = (list: FileList | null) => {
    const files = [...(list ?? [])];
    if (files.length > 0) add(files);
  };
  const onDrop = (event: DragEvent) => {
    event.preventDefault();
    setOver(false);
    take(event.dataTransfer.files);
  };
  const onPaste = (event: ClipboardEvent) => {
    if (event.clipboardData.files.length === 0) return;
    event.preventDefault();
    take(event.clipboardData.files);
  };

  return (
    <div
      role="group"
      aria-label="Add evidence"
      aria-describedby={hint}
      onDragOver={(event) => {
        event.preventDefault();
        setOver(true);
      }}
      onDragLeave={(event) => {
        if (!event.currentTarget.contains(event.relatedTarget instanceof Node ? event.relatedTarget : null))
          setOver(false);
      }}
      onDrop={onDrop}
      onPaste={onPaste}
      className={clsx(
        "rounded-md border border-dashed p-3 transition-colors duration-100 print:hidden",
        over ? "border-copper bg-copper-ground" : "border-edge bg-raised",
        className,
      )}
    >
      <div className="flex flex-wrap items-center gap-2">
        {pictures && (
          <Button kind="plain" size={size} className="pointer-fine:hidden" onPress={() => camera.current?.click()}>
            <Icon name="camera" /> Take a photo
          </Button>
        )}
        <Button kind="plain" size={size} onPress={() => dialog.current?.click()}>
          <Icon name="upload" /> Choose files
        </Button>
        <span className="text-sm text-ink-soft pointer-coarse:hidden">or drop them here, or paste with Ctrl V</span>
      </div>
      <p id={hint} className="mt-2 text-xs text-ink-soft">
        {limitsText(kinds)}
      </p>
      {pictures && <FileInput inputRef={camera} accept="image/*" capture onFiles={take} />}
      <FileInput inputRef={dialog} accept={kinds.map((kind) => ACCEPT[kind]).join(",")} onFiles={take} />
      <div aria-live="polite">
        {notice && <p className="mt-2 text-sm text-ink-soft">{notice}</p>}
        {lines.length > 0 && (
          <ul className="mt-3 grid gap-2">
            {lines.map((line) => (
              <UploadLineRow
                key={line.uploadId}
                line={line}
                onCancel={() => cancel(line.uploadId)}
                onRetry={() => retry(line.uploadId)}
              />
            ))}
          </ul>
        )}
      </div>
    </div>
  );
}

type FileInputProps = {
  inputRef: React.Ref<HTMLInputElement>;
  accept: string;
  capture?: boolean;
  onFiles: (files: FileList | null) => void;
};

/** Hidden; the buttons open it. Emptied after each choice, so that the same file can be chosen again. */
function FileInput({ inputRef, accept, capture, onFiles }: FileInputProps) {
  return (
    <input
      ref={inputRef}
      type="file"
      hidden
      multiple={!capture}
      accept={accept}
      {...(capture ? { capture: "environment" as const } : {})}
      onChange={(event) => {
        onFiles(event.currentTarget.files);
        event.currentTarget.value = "";
      }}
    />
  );
}
