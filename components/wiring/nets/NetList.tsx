"use client";

import { useVirtualizer } from "@tanstack/react-virtual";
import clsx from "clsx";
import { useEffect, useRef, type KeyboardEvent } from "react";
import type { Net, NetFacts } from "@/lib/calc/interconnect";
import type { NetLine } from "./net-lines";
import { NET_COLUMNS, NetRow } from "./NetRow";

type Props = {
  lines: readonly NetLine[];
  factsOf: (net: Net) => NetFacts;
  chosen: NetLine | undefined;
  /** Beside an open net only the names fit. */
  isNarrow: boolean;
  onChoose: (net: string) => void;
};

const ROW = 52;
/** Rows of the first paint, before the height of the window is known. */
const FIRST = { width: 800, height: 620 };

/** Thousands of nets: only those in sight are there. Arrows walk, Enter opens; with a net open, walking opens. */
export function NetList({ lines, factsOf, chosen, isNarrow, onChoose }: Props) {
  const box = useRef<HTMLDivElement>(null);
  // eslint-disable-next-line react-hooks/incompatible-library -- its functions are used in this render only
  const virtual = useVirtualizer({
    count: lines.length,
    getScrollElement: () => box.current,
    estimateSize: () => ROW,
    initialRect: FIRST,
    overscan: 8,
  });
  const at = chosen ? lines.indexOf(chosen) : -1;

  useEffect(() => {
    if (at >= 0) virtual.scrollToIndex(at, { align: "auto" });
    // Only when another net is opened: scrolling away from it is the reader's own wish.
    // eslint-disable-next-line react-hooks/exhaustive-deps
  }, [at]);

  function walk(event: KeyboardEvent) {
    const step = { ArrowDown: 1, ArrowUp: -1, PageDown: 10, PageUp: -10 }[event.key];
    if (step === undefined || event.altKey || event.ctrlKey || event.metaKey) return;
    event.preventDefault();
    const focused = document.activeElement?.getAttribute("data-index");
    const from = focused ? Number(focused) : at;
    const next = Math.min(Math.max(from + step, 0), lines.length - 1);
    virtual.scrollToIndex(next, { align: "auto" });
    const line = lines[next];
    if (isNarrow && line) onChoose(line.net.id);
    requestAnimationFrame(() => box.current?.querySelector<HTMLElement>(`[data-index="${next}"]`)?.focus());
  }

  if (lines.length === 0) {
    return (
      <p className="rounded border border-dashed border-rule-strong px-4 py-5 text-ink-soft">
        No net fits what you chose above.
      </p>
    );
  }
  return (
    <>
      {!isNarrow && (
        <p
          aria-hidden="true"
          className={clsx(NET_COLUMNS, "px-3.5 pb-1 pr-7 text-sm font-semibold text-ink-soft max-sm:hidden")}
        >
          <span>Net</span>
          <span>Class</span>
          <span>Cards, by slot</span>
          <span>In short</span>
        </p>
      )}
      <div
        ref={box}
        role="list"
        aria-label="Nets"
        onKeyDown={walk}
        className={clsx(
          "relative overflow-y-auto overscroll-contain rounded-lg border border-rule bg-sheet",
          "h-[min(72dvh,48rem)] [scrollbar-gutter:stable]",
        )}
      >
        <div style={{ height: virtual.getTotalSize() }} className="relative">
          {virtual.getVirtualItems().map((item) => {
            const line = lines[item.index];
            return (
              line && (
                <div
                  key={line.net.id}
                  role="listitem"
                  aria-setsize={lines.length}
                  aria-posinset={item.index + 1}
                  style={{ height: item.size, transform: `translateY(${item.start}px)` }}
                  className="absolute inset-x-0 top-0"
                >
                  <NetRow
                    line={line}
                    index={item.index}
                    factsOf={factsOf}
                    isChosen={line === chosen}
                    isNarrow={isNarrow}
                    onChoose={onChoose}
                  />
                </div>
              )
            );
          })}
        </div>
      </div>
    </>
  );
}
