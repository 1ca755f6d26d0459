"use client";

import { CheckPreview as AsOnTheBench } from "@/components/bench/CheckPreview";
import { checkKind } from "@/lib/check-kinds/list";
import { fieldsOf, type CheckDraft } from "./check-draft";

/** The editor knows no board face; pins are named in words here and drawn at the bench. */
const NO_FACE = { connectorType: null, connectorReference: "" };

/** The check as the builder meets it, judged by the limits alone as one tries it. Nothing is recorded from here. */
export function CheckPreview({ draft }: { draft: CheckDraft }) {
  const kind = checkKind(draft.kind);
  const spec = kind.readTyped(draft.typed);
  const { covers } = fieldsOf(draft);
  return (
    <section aria-label="As on the bench" className="lg:sticky lg:top-0 lg:self-start">
      <p className="mb-2 text-sm text-ink-soft">As on the bench</p>
      {spec.ok ? (
        <AsOnTheBench
          key={`${draft.kind} ${JSON.stringify(spec.value)}`}
          check={{ ...draft, title: draft.title || "Title", spec: spec.value, covers }}
          board={NO_FACE}
          rule="simple"
        />
      ) : (
        <p className="rounded-lg border border-rule-strong bg-raised p-4 text-sm text-ink-soft">
          It appears here when the {kind.label.toLowerCase()} is filled in.
        </p>
      )}
    </section>
  );
}
