"use client";

import { Button } from "@/components/ui/Button";
import { QuantityField } from "@/components/ui/QuantityField";
import type { BenchFormProps } from "../kind";
import type { Entry, Spec } from "./schema";

export function BenchForm({ spec, draft, onDraft, judged, onSubmit, busy }: BenchFormProps<Spec, Entry>) {
  const change = (row: number, column: number, typed: string) =>
    onDraft({
      cells: draft.cells.map((cells, r) => (r === row ? cells.map((cell, c) => (c === column ? typed : cell)) : cells)),
    });
  return (
    <div className="grid gap-3">
      {spec.rows.map((row, r) =>
        spec.columns.map((column, c) => (
          <QuantityField
            key={`${r} ${c}`}
            label={`${row.label}, ${column}`}
            suffix={row.unit}
            value={draft.cells[r]?.[c] ?? ""}
            onChange={(typed) => change(r, c, typed)}
          />
        )),
      )}
      <p>{judged?.ok ? judged.sentences.join(" ") : judged?.message}</p>
      <Button isDisabled={busy || !judged?.ok} onPress={() => onSubmit(draft)}>
        Record
      </Button>
    </div>
  );
}
