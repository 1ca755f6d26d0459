"use client";

import { useEffect } from "react";
import { Button } from "@/components/ui/Button";
import { buttonStyle } from "@/components/ui/button-style";
import { DateTime } from "@/components/ui/DateTime";
import { Dialog } from "@/components/ui/Dialog";
import { Icon } from "@/components/ui/Icon";
import { IconButton } from "@/components/ui/IconButton";
import { sizeText } from "@/lib/storage/limits";
import type { EvidenceView } from "@/lib/traveler/traveler-view";
import { CaptionForm } from "./CaptionForm";
import { DataHead } from "./DataHead";
import { altText, fileAddress, isPicture, KIND_LABELS } from "./file-address";
import { useRemoval, type EvidenceActions } from "./use-evidence-acts";

type Props = {
  project: string;
  evidence: readonly EvidenceView[];
  zone: string;
  actions: EvidenceActions | undefined;
  /** Id of the one shown; null when closed. */
  open: string | null;
  onOpen: (id: string | null) => void;
};

/** One file large, with what is known of it. Arrow keys go to the next, Escape closes. */
export function EvidenceViewer({ project, evidence, zone, actions, open, onOpen }: Props) {
  const index = evidence.findIndex((one) => one.id === open);
  const shown = evidence[index];
  const before = evidence[index - 1];
  const after = evidence[index + 1];
  useArrows(shown !== undefined, before?.id, after?.id, onOpen);

  return (
    <Dialog
      title={shown ? altText(shown) : ""}
      width="lg"
      isOpen={shown !== undefined}
      onOpenChange={(isOpen) => !isOpen && onOpen(null)}
    >
      {shown && (
        <div className="flex flex-col gap-4">
          <Stage project={project} evidence={shown} />
          {evidence.length > 1 && (
            <div className="flex items-center justify-center gap-2">
              <IconButton
                icon="chevron-left"
                label="Before"
                isDisabled={!before}
                onPress={() => before && onOpen(before.id)}
              />
              <span className="mono text-xs text-ink-soft" aria-live="polite">
                {index + 1} of {evidence.length}
              </span>
              <IconButton
                icon="chevron-right"
                label="Next"
                isDisabled={!after}
                onPress={() => after && onOpen(after.id)}
              />
            </div>
          )}
          <Facts evidence={shown} zone={zone} />
          {actions && <CaptionForm key={shown.id} project={project} evidence={shown} action={actions.caption} />}
          <div className="flex flex-wrap justify-between gap-2">
            <a href={fileAddress(project, shown.id)} download={shown.fileName} className={buttonStyle("plain")}>
              <Icon name="file" /> Download
            </a>
            {actions && (
              <RemoveButton
                {...{ project, actions }}
                evidence={shown}
                onRemoved={() => onOpen(after?.id ?? before?.id ?? null)}
              />
            )}
          </div>
        </div>
      )}
    </Dialog>
  );
}

function Stage({ project, evidence }: { project: string; evidence: EvidenceView }) {
  if (!isPicture(evidence)) return <DataHead project={project} evidence={evidence} />;
  return (
    <a
      href={fileAddress(project, evidence.id)}
      target="_blank"
      rel="noopener"
      title="Open at full size"
      className="block"
    >
      {/* eslint-disable-next-line @next/next/no-img-element -- private, sized by the worker, read through the app */}
      <img
        src={fileAddress(project, evidence.id, "large")}
        alt={altText(evidence)}
        style={stageSize(evidence.width ?? 1280, evidence.height ?? 960)}
        className="mx-auto rounded bg-ink/6"
      />
    </a>
  );
}

/** As large as fits, never larger than the picture itself, and the same before it has loaded. */
const stageSize = (width: number, height: number) => ({
  width: `min(100%, ${width}px, ${((56 * width) / height).toFixed(2)}dvh)`,
  aspectRatio: `${width} / ${height}`,
});

function Facts({ evidence, zone }: { evidence: EvidenceView; zone: string }) {
  const size = evidence.width && evidence.height ? `${evidence.width} × ${evidence.height} px, ` : "";
  return (
    <p className="text-sm text-ink-soft">
      {KIND_LABELS[evidence.kind]} <span className="mono text-xs">{evidence.fileName}</span>, {size}
      {sizeText(evidence.bytes)}. {evidence.by.name}, <DateTime at={evidence.at} zone={zone} />.
    </p>
  );
}

type RemoveProps = { project: string; evidence: EvidenceView; actions: EvidenceActions; onRemoved: () => void };

function RemoveButton({ project, evidence, actions, onRemoved }: RemoveProps) {
  const { takeAway, isPending } = useRemoval(project, actions, onRemoved);
  return (
    <Button kind="danger" isPending={isPending} onPress={() => void takeAway(evidence)}>
      Remove
    </Button>
  );
}

/** On the document, since the dialog itself has the focus; a caption being typed keeps its arrows. */
function useArrows(isOn: boolean, before: string | undefined, after: string | undefined, onOpen: (id: string) => void) {
  useEffect(() => {
    if (!isOn) return;
    const onKey = (event: KeyboardEvent) => {
      if (event.target instanceof HTMLElement && event.target.closest("input, textarea")) return;
      const next = event.key === "ArrowLeft" ? before : event.key === "ArrowRight" ? after : undefined;
      if (next === undefined) return;
      event.preventDefault();
      onOpen(next);
    };
    document.addEventListener("keydown", onKey);
    return () => document.removeEventListener("keydown", onKey);
  }, [isOn, before, after, onOpen]);
}
