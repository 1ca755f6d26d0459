"use client";

import { useRouter } from "next/navigation";
import { useState } from "react";
import { EvidenceGallery } from "@/components/evidence/EvidenceGallery";
import { EvidencePicker } from "@/components/evidence/EvidencePicker";
import type { EvidenceActions } from "@/components/evidence/use-evidence-acts";
import { Page } from "@/components/shell/Page";
import { Button } from "@/components/ui/Button";
import { ButtonLink } from "@/components/ui/ButtonLink";
import { Panel } from "@/components/ui/Panel";
import type { BoardFace } from "@/components/bench/PinDrawing";
import type { BoardNames } from "@/lib/board/load-board-names";
import type { FaultView } from "@/lib/fault/load-fault";
import type { FaultActs } from "./fault-acts";
import { FaultAside } from "./FaultAside";
import { FaultEditor } from "./FaultEditor";
import { FaultStateMark } from "./FaultStateMark";

type Props = {
  project: string;
  zone: string;
  fault: FaultView;
  face: BoardFace;
  names: BoardNames;
  can: { write: boolean; rework: boolean; attach: boolean };
  acts: Pick<FaultActs, "edit" | "similar">;
  evidence: EvidenceActions;
};

/** One defect: what was seen, what it was, how it was mended, what it teaches. */
export function FaultPlace({ project, zone, fault, face, names, can, acts, evidence }: Props) {
  const router = useRouter();
  const [isEditing, setEditing] = useState(false);
  const { serial, archived } = fault.unit;
  const unit = `/projects/${project}/units/${encodeURIComponent(serial)}`;
  return (
    <Page
      title={
        <>
          <span className="mono text-ink-soft mr-1 text-[0.8em] font-normal">F{fault.number}</span> {fault.title}
        </>
      }
      lede={
        <span className="flex flex-wrap items-baseline gap-x-2.5 gap-y-1">
          <FaultStateMark state={fault.state} />
          <span>
            {serial}, {fault.board.name} rev {fault.unit.revision}
          </span>
        </span>
      }
      actions={
        !isEditing && (
          <>
            {can.rework && !archived && (
              <ButtonLink href={`${unit}/reworks/new?fault=${fault.number}`} prefetch={false}>
                Record a rework
              </ButtonLink>
            )}
            {can.write && (
              <Button kind="primary" onPress={() => setEditing(true)}>
                Write on it
              </Button>
            )}
          </>
        )
      }
      aside={isEditing ? undefined : <FaultAside {...{ project, zone, fault, face }} />}
    >
      {isEditing ? (
        <FaultEditor {...{ project, fault, names, acts }} onClose={() => setEditing(false)} />
      ) : (
        <>
          <Record fault={fault} />
          <Panel title="Pictures" note={fault.evidence.length > 0 ? String(fault.evidence.length) : undefined}>
            <div className="grid gap-4">
              <EvidenceGallery
                project={project}
                zone={zone}
                evidence={fault.evidence}
                actions={can.attach ? evidence : undefined}
              />
              {fault.evidence.length === 0 && !can.attach && <p className="text-ink-soft">None yet.</p>}
              {can.attach && (
                <EvidencePicker
                  project={project}
                  target={{ faultId: fault.id }}
                  kinds={["photo", "scope-data"]}
                  onUploaded={() => router.refresh()}
                />
              )}
            </div>
          </Panel>
        </>
      )}
    </Page>
  );
}

const PARTS = [
  ["symptom", "Symptom"],
  ["suspected", "Suspected"],
  ["tried", "Tried"],
  ["cause", "Cause"],
  ["mend", "Mend"],
  ["lesson", "Lesson"],
  ["nextRevision", "The next revision should change"],
] as const;

/** What is not known yet is said in one line, not in seven empty ones. */
function Record({ fault }: { fault: FaultView }) {
  const written = PARTS.filter(([key]) => fault[key] !== "");
  const missing = PARTS.filter(([key]) => fault[key] === "").map(([key, label]) =>
    key === "nextRevision" ? "what the next revision should change" : label.toLowerCase(),
  );
  return (
    <Panel>
      <dl className="grid gap-x-6 gap-y-3.5 sm:grid-cols-[9rem_minmax(0,1fr)]">
        {written.map(([key, label]) => (
          <div key={key} className="contents">
            <dt className="text-ink-soft text-sm max-sm:-mb-3 sm:pt-0.5">{label}</dt>
            <dd className="max-w-prose whitespace-pre-line">{fault[key]}</dd>
          </div>
        ))}
      </dl>
      {missing.length > 0 && (
        <p className="border-rule text-ink-soft mt-4 border-t pt-3 text-sm first:mt-0 first:border-0 first:pt-0">
          Not written yet: {missing.join(", ")}.
        </p>
      )}
    </Panel>
  );
}
