"use client";

import { NumericPad } from "@/components/bench/NumericPad";
import { PadSlot } from "@/components/bench/PadSlot";
import { ReadingField } from "@/components/bench/ReadingField";
import { useTypedAnywhere } from "@/components/bench/use-typed-anywhere";
import { LimitBar } from "@/components/ui/glyphs/LimitBar";
import type { BenchFormProps } from "../kind";
import { drawnLimits } from "../reading-limits";
import type { Entry, Spec } from "./schema";

/** The figure as one reads it off the meter, its place between the limits, and the pad. */
export function BenchForm({ spec, draft, onDraft, judged, onSubmit, busy, rule }: BenchFormProps<Spec, Entry>) {
  const write = (typed: string) => onDraft({ typed });
  const field = useTypedAnywhere(draft.typed, write);
  const reading = judged?.ok ? judged.readings[0] : undefined;
  const drawn = drawnLimits(spec.limits.value, spec.unit, reading?.expandedUncertainty ?? null, rule);
  const shown = reading && Number.isFinite(reading.value) ? reading.value : undefined;

  return (
    <div className="grid gap-2">
      <ReadingField
        ref={field}
        label="Reading"
        unit={spec.unit}
        typed={draft.typed}
        judged={judged}
        verdict={reading?.verdict}
        disabled={busy}
        onTyped={write}
        onEnter={() => onSubmit(draft)}
      />
      <LimitBar {...drawn} value={shown} size="bench" className="px-6" />
      {judged?.ok && <p className="text-ink-soft text-sm">{judged.sentences.join(" ")}</p>}
      <PadSlot>
        <NumericPad unit={spec.unit} typed={draft.typed} onTyped={write} disabled={busy} />
      </PadSlot>
    </div>
  );
}
