import type { ComponentProps } from "react";
import type { CheckView } from "@/lib/traveler/traveler-view";
import type { BenchProps } from "./bench-props";
import { EntryPanel } from "./EntryPanel";
import { EvidenceStrip } from "./EvidenceStrip";
import { Pad } from "./PadSlot";
import { clearFiles } from "./queue/file-shelf";

type Entry = ComponentProps<typeof EntryPanel>;
type Props = Pick<Entry, "kind" | "recording" | "onPad" | "onRecord" | "onPhoto" | "onFile" | "onNote"> & {
  props: Pick<BenchProps, "project" | "may">;
  current: CheckView;
  pad: ComponentProps<typeof Pad>["value"] & { isOpen: boolean };
};

/** What one touches: the evidence so far, and the entry with its buttons. */
export function RecordSection({ props: { project, may }, current, pad, ...entry }: Props) {
  return (
    <section
      aria-label="Record"
      className="border-rule bg-sheet flex max-h-[calc(100dvh-6.5rem)] shrink-0 flex-col gap-2 border-t px-4 pt-3 pb-[max(0.75rem,env(safe-area-inset-bottom))] lg:self-start lg:border-t-0 lg:pt-6"
    >
      {!may.record && (
        <p className="text-ink-soft text-sm">You can look at this traveler. Builders and maintainers record.</p>
      )}
      <EvidenceStrip
        files={entry.recording.files}
        smallHref={(id) => `/api/projects/${project.slug}/files/${id}?size=small`}
        onRemove={(file) => void clearFiles(file.checkId, [file.uploadId])}
      />
      {may.record && (
        <Pad value={pad}>
          <EntryPanel
            {...entry}
            spec={current.spec}
            checkId={current.id}
            rule={project.rule}
            blocked={current.blockers.length > 0}
            may={may}
            padShown={pad.isOpen}
          />
        </Pad>
      )}
    </section>
  );
}
