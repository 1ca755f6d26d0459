import clsx from "clsx";
import { Icon } from "@/components/ui/Icon";
import { sizeText } from "@/lib/storage/limits";
import type { EvidenceView } from "@/lib/traveler/traveler-view";
import { altText, fileAddress, isPicture, KIND_LABELS } from "./file-address";

export type EvidenceThumbProps = {
  /** Slug. */
  project: string;
  evidence: EvidenceView;
  /** "fill" cuts to the frame around it, "fit" shows all of it. */
  fit?: "fill" | "fit";
  className?: string;
};

/** A picture at the size of a stamp, or the sheet of a data file. The frame keeps its shape while it loads. */
export function EvidenceThumb({ project, evidence, fit = "fill", className }: EvidenceThumbProps) {
  const frame = clsx("block aspect-4/3 w-full overflow-hidden rounded border border-rule", className);
  if (!isPicture(evidence)) {
    return (
      <span className={clsx(frame, "flex! flex-col bg-raised items-center justify-center gap-1.5 p-2 text-ink-soft")}>
        <Icon name="file" size={24} />
        <span className="mono max-w-full truncate text-2xs">{evidence.fileName}</span>
        <span className="sr-only">
          {KIND_LABELS[evidence.kind]}, {sizeText(evidence.bytes)}
        </span>
      </span>
    );
  }
  return (
    <span className={clsx(frame, "bg-ink/6")}>
      {/* eslint-disable-next-line @next/next/no-img-element -- private, sized by the worker, read through the app */}
      <img
        src={fileAddress(project, evidence.id, "small")}
        alt={altText(evidence)}
        width={evidence.width ?? 320}
        height={evidence.height ?? 240}
        loading="lazy"
        decoding="async"
        className={clsx("size-full", fit === "fill" ? "object-cover" : "object-contain")}
      />
    </span>
  );
}
