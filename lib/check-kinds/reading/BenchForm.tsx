"use client";

import { useEffect, useRef } from "react";
import { NumericPad } from "@/components/bench/NumericPad";
import { PadSlot } from "@/components/bench/PadSlot";
import { ReadingField } from "@/components/bench/ReadingField";
import { startsReading } from "@/components/bench/starts-reading";
import { LimitBar } from "@/components/ui/glyphs/LimitBar";
import type { BenchFormProps } from "../kind";
import { drawnLimits } from "../reading-limits";
import type { Entry, Spec } from "./schema";

/** The figure as one reads it off the meter, its place between the limits, and the pad. */
export function BenchForm({ spec, draft, onDraft, judged, onSubmit, busy, rule }: BenchFormProps<Spec, Entry>) {
  const field = useRef<HTMLInputElement>(null);
  const reading = judged?.ok ? judged.readings[0] : undefined;
  const drawn = drawnLimits(spec.limits.value, spec.unit, reading?.expandedUncertainty ?? null, rule);
  const shown = reading && Number.isFinite(reading.value) ? reading.value : undefined;

  useEffect(() => startsReading(() => field.current?.focus()), []);

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
        onTyped={(typed) => onDraft({ typed })}
        onEnter={() => onSubmit(draft)}
      />
      <LimitBar {...drawn} value={shown} size="bench" className="px-6" />
      {judged?.ok && <p className="text-ink-soft text-sm">{judged.sentences.join(" ")}</p>}
      <PadSlot>
        <NumericPad unit={spec.unit} typed={draft.typed} onTyped={(typed) => onDraft({ typed })} disabled={busy} />
      </PadSlot>
    </div>
  );
}
