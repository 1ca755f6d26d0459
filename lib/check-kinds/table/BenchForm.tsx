"use client";

import { useState } from "react";
import { NumericPad } from "@/components/bench/NumericPad";
import { PadSlot } from "@/components/bench/PadSlot";
import { ReadingField } from "@/components/bench/ReadingField";
import { useTypedAnywhere } from "@/components/bench/use-typed-anywhere";
import { LimitBar } from "@/components/ui/glyphs/LimitBar";
import type { BenchFormProps } from "../kind";
import { drawnLimits } from "../reading-limits";
import { CellGrid } from "./CellGrid";
import { cellAfter, cellsOf, firstOpenCell, type CellPlace } from "./cells";
import { withCell } from "./entry";
import type { Entry, Spec } from "./schema";

/** One cell at a time, big; above it the whole grid, in which a touch chooses the cell. */
export function BenchForm({ spec, draft, onDraft, judged, onSubmit, busy, rule }: BenchFormProps<Spec, Entry>) {
  const [at, setAt] = useState<CellPlace>(() => firstOpenCell(spec, draft) ?? { row: 0, column: 0 });
  const cells = cellsOf(spec, draft, rule);
  const cell = cells.find((one) => one.row === at.row && one.column === at.column);

  const write = (typed: string) => onDraft(withCell(draft, spec.rows.length, spec.columns.length, at, typed));
  const field = useTypedAnywhere(cell?.typed ?? "", write);
  if (!cell) return null;

  const goOn = () => {
    const next = cellAfter(spec, draft, at);
    if (next) setAt(next);
    else onSubmit(draft);
  };
  const drawn = drawnLimits(cell.limits.value, cell.unit, null, rule);
  return (
    <div className="grid gap-2">
      <CellGrid spec={spec} cells={cells} at={at} onChoose={setAt} />
      <div className="flex items-end gap-2">
        <ReadingField
          key={`${at.row} ${at.column}`}
          ref={field}
          label={`${cell.label}`}
          unit={cell.unit}
          typed={cell.typed}
          judged={cell.judged}
          verdict={cell.judged?.ok ? cell.judged.verdict : undefined}
          disabled={busy}
          onTyped={write}
          onEnter={goOn}
        />
        <button
          type="button"
          onPointerDown={(event) => event.preventDefault()}
          onClick={goOn}
          className="border-edge bg-raised min-h-16 shrink-0 rounded-md border px-4 font-semibold"
        >
          {cellAfter(spec, draft, at) ? "Next cell" : "Record"}
        </button>
      </div>
      <LimitBar {...drawn} value={cell.value} size="bench" className="px-6" />
      {judged?.ok && <p className="text-ink-soft text-sm">{judged.sentences.join(" ")}</p>}
      <PadSlot>
        <NumericPad unit={cell.unit} typed={cell.typed} onTyped={write} disabled={busy} />
      </PadSlot>
    </div>
  );
}
