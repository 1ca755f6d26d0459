"use client";

import { useState } from "react";
import type { DecisionRule } from "@/db/schema/projects";
import type { Coverage, Stage } from "@/db/schema/procedures";
import { checkKind } from "@/lib/check-kinds/list";
import { benchKind } from "@/lib/check-kinds/bench-list";
import { BenchButton } from "./BenchButton";
import { CheckBody } from "./CheckBody";
import { Pad } from "./PadSlot";
import type { BoardFace } from "./PinDrawing";
import { stageName } from "@/lib/procedure/stages";

export type PreviewedCheck = {
  title: string;
  stage: Stage;
  instruction: string;
  caution: string;
  reference: string;
  holdPoint: boolean;
  kind: string;
  /** As it would be stored: what the kind's readTyped answers. */
  spec: unknown;
  covers: Coverage;
};

type Props = { check: PreviewedCheck; board: BoardFace; rule: DecisionRule };

const ALWAYS_OPEN = { isOpen: true, open: () => undefined };

/** The check as the builder will have it at the bench. One can try the limits; nothing is recorded. */
export function CheckPreview({ check, board, rule }: Props) {
  const [entry, setEntry] = useState<unknown>();
  const kind = benchKind(check.kind);
  if (!kind) return null;
  const { BenchForm, stated } = kind;
  const draft = kind.isEntry(entry) ? entry : kind.emptyEntry(check.spec);
  const context = { rule, instrumentRanges: [], evidence: [], note: "" };
  const judged = kind.isBlank(draft) ? undefined : kind.judge(check.spec, draft, context);
  const expectation = checkKind(check.kind).expectation(check.spec);
  return (
    <div
      className="border-rule-strong bg-sheet mx-auto max-w-96 overflow-hidden rounded-lg border"
      aria-label="As on the bench"
      role="group"
    >
      <p className="border-rule font-head border-b px-4 py-3 text-lg font-semibold">{stageName(check.stage)}</p>
      <div className="px-4 py-4">
        <CheckBody
          check={{ ...check, expectation, state: "untested", stateReason: "", blockers: [] }}
          board={board}
          expected={kind.expected(check.spec)}
          measured={kind.measured}
        />
      </div>
      <div className="border-rule border-t px-4 py-3">
        <Pad value={ALWAYS_OPEN}>
          <BenchForm
            spec={check.spec}
            draft={draft}
            onDraft={setEntry}
            judged={judged}
            onSubmit={() => undefined}
            busy={false}
            rule={rule}
          />
        </Pad>
        {stated && (
          <div className="mt-2 grid grid-cols-2 gap-2">
            <BenchButton kind="passed" onClick={() => setEntry(stated(true))}>
              Conforms
            </BenchButton>
            <BenchButton kind="failed" onClick={() => setEntry(stated(false))}>
              Does not conform
            </BenchButton>
          </div>
        )}
      </div>
    </div>
  );
}
