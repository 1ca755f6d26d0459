"use client";

import clsx from "clsx";
import { useEffect, useState, type ReactNode } from "react";
import { DropZone, FileTrigger, isFileDropItem, Text } from "react-aria-components";
import { Button } from "./Button";
import { Icon } from "./Icon";

export type FileDropProps = {
  /** What belongs here: "Photos, scope pictures or scope data". */
  label: string;
  /** Limits in one line: "JPEG, PNG or CSV, up to 32 MB each". */
  hint?: ReactNode;
  onFiles: (files: File[]) => void;
  /** Media types or endings offered in the picker; what really arrives is judged by its content elsewhere. */
  accept?: readonly string[];
  isMultiple?: boolean;
  hasCamera?: boolean;
  /** Takes files that are pasted anywhere on the page while this stands on it. */
  takesPaste?: boolean;
  isDisabled?: boolean;
  size?: "md" | "bench";
  className?: string;
};

/** Presentational: drop, paste, pick or photograph; the files come out, nothing is sent from here. */
export function FileDrop(props: FileDropProps) {
  const { label, hint, onFiles, accept, isMultiple = true, hasCamera, takesPaste = true, isDisabled = false } = props;
  usePastedFiles(takesPaste && !isDisabled, onFiles);
  const [isReading, setReading] = useState(false);
  const size = props.size === "bench" ? "bench" : "md";
  const give = (list: FileList | null) => {
    const files = Array.from(list ?? []);
    if (files.length > 0) onFiles(files);
  };
  const types = accept ? { acceptedFileTypes: accept } : {};
  return (
    <DropZone
      isDisabled={isDisabled}
      getDropOperation={() => "copy"}
      onDrop={async ({ items }) => {
        setReading(true);
        const files = await Promise.all(items.filter(isFileDropItem).map((item) => item.getFile())).finally(() =>
          setReading(false),
        );
        if (files.length > 0) onFiles(isMultiple ? files : files.slice(0, 1));
      }}
      className={clsx(
        "flex flex-col gap-3 rounded-lg border border-dashed border-edge px-4 py-4 transition-colors",
        "data-drop-target:border-copper data-drop-target:bg-copper-ground data-focus-visible:outline-2 data-focus-visible:outline-offset-2 data-focus-visible:outline-focus",
        props.className,
      )}
    >
      <div className="flex gap-3">
        <Icon name="upload" size={20} className="mt-0.5 text-ink-soft" />
        <div className="min-w-0">
          <Text slot="label" className="font-semibold">
            {label}
          </Text>
          <p className="text-sm text-ink-soft">
            {isReading ? "Reading…" : hint}
            <span className="max-sm:hidden"> Drop {isMultiple ? "them" : "it"} here or paste.</span>
          </p>
        </div>
      </div>
      <div className="flex flex-wrap gap-2">
        {hasCamera && (
          <FileTrigger {...types} defaultCamera="environment" onSelect={give}>
            <Button size={size} isDisabled={isDisabled}>
              <Icon name="camera" /> Take a photo
            </Button>
          </FileTrigger>
        )}
        <FileTrigger {...types} allowsMultiple={isMultiple} onSelect={give}>
          <Button size={size} isDisabled={isDisabled}>
            <Icon name="file" /> Choose {isMultiple ? "files" : "a file"}
          </Button>
        </FileTrigger>
      </div>
    </DropZone>
  );
}

function usePastedFiles(isOn: boolean, onFiles: (files: File[]) => void) {
  useEffect(() => {
    if (!isOn) return;
    const take = (event: ClipboardEvent) => {
      const files = Array.from(event.clipboardData?.files ?? []);
      if (files.length === 0) return;
      event.preventDefault();
      onFiles(files);
    };
    document.addEventListener("paste", take);
    return () => document.removeEventListener("paste", take);
  }, [isOn, onFiles]);
}
