"use client";

import { Button } from "@/components/ui/Button";
import { QuantityField } from "@/components/ui/QuantityField";
import type { BenchFormProps } from "../kind";
import type { Entry, Spec } from "./schema";

export function BenchForm({ spec, draft, onDraft, judged, onSubmit, busy }: BenchFormProps<Spec, Entry>) {
  return (
    <div className="grid gap-3">
      <QuantityField
        isBench
        label="Reading"
        suffix={spec.unit}
        value={draft.typed}
        onChange={(typed) => onDraft({ typed })}
      />
      <p>{judged?.ok ? judged.sentences.join(" ") : judged?.message}</p>
      <Button isDisabled={busy || !judged?.ok} onPress={() => onSubmit(draft)}>
        Record
      </Button>
    </div>
  );
}
