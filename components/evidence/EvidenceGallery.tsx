"use client";

import clsx from "clsx";
import { useState } from "react";
import type { EvidenceView } from "@/lib/traveler/traveler-view";
import { altText } from "./file-address";
import { EvidenceThumb } from "./EvidenceThumb";
import { EvidenceViewer } from "./EvidenceViewer";
import type { EvidenceActions } from "./use-evidence-acts";

export type EvidenceGalleryProps = {
  /** Slug. */
  project: string;
  evidence: readonly EvidenceView[];
  /** IANA zone of the reader. */
  zone: string;
  /** With them the viewer can caption, remove and restore. */
  actions?: EvidenceActions | undefined;
  /** "strip" is one line of small ones, for rows; "grid" is a wall of them. */
  form?: "grid" | "strip";
  className?: string;
};

/** Thumbnails with captions; each opens the viewer, in which the arrow keys go on. */
export function EvidenceGallery({ project, evidence, zone, actions, form = "grid", className }: EvidenceGalleryProps) {
  const [open, setOpen] = useState<string | null>(null);
  if (evidence.length === 0) return null;
  const strip = form === "strip";
  return (
    <>
      <ul
        className={clsx(
          strip ? "flex flex-wrap gap-2" : "grid grid-cols-[repeat(auto-fill,minmax(min(9.5rem,100%),1fr))] gap-3",
          className,
        )}
      >
        {evidence.map((one) => (
          <li key={one.id} className={strip ? "w-20" : "min-w-0"}>
            <figure>
              <button
                type="button"
                onClick={() => setOpen(one.id)}
                aria-label={`Look at ${altText(one)}`}
                className="block w-full rounded hover:brightness-95"
              >
                <EvidenceThumb project={project} evidence={one} />
              </button>
              {!strip && one.caption !== "" && (
                <figcaption className="mt-1 line-clamp-3 text-sm text-ink-soft">{one.caption}</figcaption>
              )}
            </figure>
          </li>
        ))}
      </ul>
      <EvidenceViewer {...{ project, evidence, zone, actions, open }} onOpen={setOpen} />
    </>
  );
}
