"use client";

import { useRouter } from "next/navigation";
import { useState, type ReactNode } from "react";
import { EvidenceGallery } from "@/components/evidence/EvidenceGallery";
import { EvidencePicker } from "@/components/evidence/EvidencePicker";
import type { EvidenceActions } from "@/components/evidence/use-evidence-acts";
import { Button } from "@/components/ui/Button";
import type { ReworkSide } from "@/db/schema/evidence";
import type { ReworkView } from "@/lib/rework/rework-view";

type Props = {
  project: string;
  zone: string;
  rework: ReworkView;
  /** Only for those who may attach. */
  evidence: EvidenceActions | undefined;
  /** Further buttons in the row. */
  children: ReactNode;
};

const SIDES: readonly [ReworkSide, string][] = [
  ["before", "Before"],
  ["after", "After"],
];

/** How it looked before the iron, and how it looks since. */
export function ReworkPictures({ project, zone, rework, evidence, children }: Props) {
  const router = useRouter();
  const [adding, setAdding] = useState<ReworkSide>();
  const shown = SIDES.filter(([side]) => rework[side].length > 0 || adding === side);
  return (
    <div className="mt-1 grid gap-3">
      {shown.length > 0 && (
        <div className="grid items-start gap-4 sm:grid-cols-2">
          {shown.map(([side, label]) => (
            <section key={side} aria-label={`${label} R${rework.number}`}>
              <h4 className="mb-1.5 text-sm font-semibold">{label}</h4>
              <EvidenceGallery project={project} zone={zone} evidence={rework[side]} actions={evidence} form="strip" />
              {adding === side && (
                <EvidencePicker
                  project={project}
                  target={{ reworkId: rework.id, reworkSide: side }}
                  kinds={["photo"]}
                  onUploaded={() => router.refresh()}
                  className="mt-2"
                />
              )}
            </section>
          ))}
        </div>
      )}
      <div className="flex flex-wrap gap-2 empty:hidden print:hidden">
        {children}
        {evidence &&
          SIDES.filter(([side]) => adding !== side).map(([side, label]) => (
            <Button key={side} size="sm" kind="quiet" onPress={() => setAdding(side)}>
              Picture {label.toLowerCase()}
            </Button>
          ))}
      </div>
    </div>
  );
}
