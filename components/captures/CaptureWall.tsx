"use client";

import Link from "next/link";
import { useState } from "react";
import { DataHead } from "@/components/evidence/DataHead";
import { EvidenceThumb } from "@/components/evidence/EvidenceThumb";
import { EvidenceViewer } from "@/components/evidence/EvidenceViewer";
import { altText } from "@/components/evidence/file-address";
import type { EvidenceActions } from "@/components/evidence/use-evidence-acts";
import { DateTime } from "@/components/ui/DateTime";
import type { CaptureView } from "@/lib/attachment/load-captures";
import { sizeText } from "@/lib/storage/limits";

type Props = {
  project: string;
  zone: string;
  captures: readonly CaptureView[];
  actions: EvidenceActions | undefined;
};

/** The shape of most scope screens; the frame runs into the card. */
const FRAME = "aspect-5/3! rounded-t-lg rounded-b-none! border-0!";

/** One card a capture: what it shows, where it belongs, who took it when. */
export function CaptureWall({ project, zone, captures, actions }: Props) {
  const [open, setOpen] = useState<string | null>(null);
  return (
    <>
      <ul className="grid grid-cols-[repeat(auto-fill,minmax(min(17rem,100%),1fr))] gap-4">
        {captures.map((capture) => (
          <li key={capture.id} className="flex min-w-0 flex-col rounded-lg border border-rule bg-sheet">
            <button
              type="button"
              onClick={() => setOpen(capture.id)}
              aria-label={`Look at ${altText(capture)}`}
              className="block w-full rounded-t-lg hover:brightness-95"
            >
              {capture.kind === "scope-data" ? (
                <DataHead project={project} evidence={capture} form="stamp" className={`bg-raised ${FRAME}`} />
              ) : (
                <EvidenceThumb
                  project={project}
                  evidence={capture}
                  fit={capture.kind === "photo" ? "fill" : "fit"}
                  className={FRAME}
                />
              )}
            </button>
            <div className="flex flex-1 flex-col gap-1 border-t border-rule px-3.5 pb-3.5 pt-3 text-sm">
              <p className="line-clamp-2 text-[0.9375rem] font-semibold leading-snug">
                {capture.caption === "" ? <span className="mono text-sm">{capture.fileName}</span> : capture.caption}
              </p>
              <Place project={project} capture={capture} />
              <p className="mt-auto pt-1 text-ink-soft">
                {capture.by.name}, <DateTime at={capture.at} zone={zone} />
                <span className="mono ml-2 whitespace-nowrap text-xs">{sizeText(capture.bytes)}</span>
              </p>
            </div>
          </li>
        ))}
      </ul>
      <EvidenceViewer {...{ project, zone, actions, open }} evidence={captures} onOpen={setOpen} />
    </>
  );
}

/** Unit and check, or the log entry, as links; files of neither say so. */
function Place({ project, capture }: { project: string; capture: CaptureView }) {
  const home = `/projects/${encodeURIComponent(project)}`;
  const { unit, check, entry } = capture;
  if (!unit && !entry) return <p className="text-ink-soft">Belongs to no check</p>;
  const unitHref = unit && `${home}/units/${encodeURIComponent(unit.serial)}`;
  return (
    <p>
      {unit && unitHref && (
        <Link href={unitHref} className="link mono mr-2 text-xs">
          {unit.serial}
        </Link>
      )}
      {check && unitHref && (
        <Link href={`${unitHref}?check=${check.id}#check-${check.id}`} className="link">
          {check.title}
        </Link>
      )}
      {entry && (
        <Link href={`${home}/log/${entry.id}`} className="link">
          {entry.title}
        </Link>
      )}
    </p>
  );
}
