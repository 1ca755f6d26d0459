"use client";

import clsx from "clsx";
import type { KeyboardEvent } from "react";
import type { OrderLine } from "@/lib/parts-list/load-parts-list";
import type { StockEdits, StockField } from "./use-stock-edits";

type Props = { line: OrderLine; field: StockField; edits: StockEdits; label: string };

/** A figure one types over where it stands. Enter keeps it and goes down, the arrows go up and down, Escape takes it back. */
export function StockCell({ line, field, edits, label }: Props) {
  const value = edits.value(line, field);
  const failure = edits.failureOf(line);
  const isWrong = failure !== undefined && (failure.field ?? field) === field;

  function press(event: KeyboardEvent<HTMLInputElement>) {
    if (event.key === "Escape") return edits.revert(line);
    const step = event.key === "ArrowUp" ? -1 : event.key === "ArrowDown" || event.key === "Enter" ? 1 : 0;
    if (step === 0) return;
    event.preventDefault();
    if (event.key === "Enter") void edits.commit(line);
    neighbour(event.currentTarget, field, step)?.select();
  }

  return (
    <input
      value={value}
      aria-label={`${label}, ${line.part}`}
      aria-invalid={isWrong || undefined}
      data-stock-cell={field}
      inputMode={field === "stock" ? "numeric" : "decimal"}
      autoComplete="off"
      maxLength={12}
      placeholder={field === "price" ? "–" : undefined}
      onChange={(event) => edits.type(line, field, event.target.value)}
      onBlur={() => void edits.commit(line)}
      onFocus={(event) => event.target.select()}
      onKeyDown={press}
      className={clsx(
        "mono min-h-8 w-20 rounded border bg-transparent px-2 text-right text-sm hover:border-edge focus:bg-raised print:border-0 print:p-0",
        isWrong ? "border-failed" : "border-rule-strong",
        edits.isPending(line) && "opacity-60",
      )}
    />
  );
}

/** The cell of the same column in the next or the former row that is in sight. */
function neighbour(from: HTMLInputElement, field: StockField, step: number): HTMLInputElement | undefined {
  const all = document.querySelectorAll<HTMLInputElement>(`input[data-stock-cell="${field}"]`);
  const inSight = [...all].filter((cell) => cell.offsetParent !== null);
  return inSight[inSight.indexOf(from) + step];
}
