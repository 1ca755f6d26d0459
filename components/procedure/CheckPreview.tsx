"use client";

import { useState } from "react";
import { Badge } from "@/components/ui/Badge";
import { Notice } from "@/components/ui/Notice";
import { checkKind } from "@/lib/check-kinds/list";
import { stageName } from "@/lib/procedure/stages";
import type { CheckDraft } from "./check-draft";

/** The check as the builder meets it, judged by the limits alone as one tries it. Nothing is recorded from here. */
export function CheckPreview({ draft }: { draft: CheckDraft }) {
  const kind = checkKind(draft.kind);
  const spec = kind.readTyped(draft.typed);
  return (
    <section aria-label="As on the bench" className="lg:sticky lg:top-0 lg:self-start">
      <p className="mb-2 text-sm text-ink-soft">As on the bench</p>
      <div className="flex flex-col gap-3 rounded-lg border border-rule-strong bg-raised p-4">
        <p className="flex flex-wrap items-center gap-2 text-sm text-ink-soft">
          {stageName(draft.stage)} {draft.holdPoint && <Badge tone="copper">hold point</Badge>}
        </p>
        <p className="font-head text-xl font-semibold leading-tight">{draft.title || "Title"}</p>
        {draft.instruction && <p className="whitespace-pre-line">{draft.instruction}</p>}
        {draft.caution && (
          <Notice kind="caution">
            <p className="whitespace-pre-line">{draft.caution}</p>
          </Notice>
        )}
        {spec.ok ? (
          <Trial key={`${draft.kind} ${JSON.stringify(spec.value)}`} kind={draft.kind} spec={spec.value} />
        ) : (
          <p className="text-sm text-ink-soft">
            What it expects appears here when the {kind.label.toLowerCase()} is filled in.
          </p>
        )}
      </div>
    </section>
  );
}

function Trial({ kind: name, spec }: { kind: string; spec: unknown }) {
  const kind = checkKind(name);
  const [entry, setEntry] = useState(() => kind.emptyEntry(spec));
  const judged = kind.judge(spec, entry, { rule: "simple", instrumentRanges: [], evidence: [], note: "" });
  return (
    <>
      <p className="mono text-lg font-semibold">{kind.expectation(spec)}</p>
      <kind.BenchForm
        spec={spec}
        draft={entry}
        onDraft={setEntry}
        judged={judged}
        rule="simple"
        onSubmit={setEntry}
        busy={false}
      />
    </>
  );
}
