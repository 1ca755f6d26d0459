"use client";

import { useVirtualizer } from "@tanstack/react-virtual";
import clsx from "clsx";
import { useRef, type ReactNode } from "react";
import type { RoundPoint, RoundProbe } from "@/lib/probing/round-view";

export type ListedProbe = { number: number; probe: RoundProbe; said?: ReactNode; tone?: "failed" | undefined };

type Props = { label: string; points: readonly RoundPoint[]; probes: readonly ListedProbe[]; className?: string };

const ROW = 44;
/** Rows of the first paint, before the height of the window is known. */
const FIRST = { width: 800, height: 420 };
const COLUMNS =
  "grid grid-cols-[2.75rem_minmax(0,1fr)_auto] items-center gap-x-3 sm:grid-cols-[3.5rem_minmax(0,1.4fr)_minmax(0,1fr)_8.5rem]";

/** Pairs in the order of probing. A hundred thousand of them: only those in sight are there. */
export function ProbeList({ label, points, probes, className }: Props) {
  const box = useRef<HTMLDivElement>(null);
  // eslint-disable-next-line react-hooks/incompatible-library -- its functions are used in this render only
  const virtual = useVirtualizer({
    count: probes.length,
    getScrollElement: () => box.current,
    estimateSize: () => ROW,
    initialRect: FIRST,
    overscan: 8,
  });
  return (
    <div
      ref={box}
      role="list"
      aria-label={label}
      tabIndex={0}
      className={clsx(
        "relative max-h-[26rem] overflow-y-auto overscroll-contain rounded-md border border-rule bg-sheet [scrollbar-gutter:stable]",
        className,
      )}
    >
      <div style={{ height: virtual.getTotalSize() }} className="relative">
        {virtual.getVirtualItems().map((item) => {
          const line = probes[item.index];
          return (
            line && (
              <div
                key={line.number}
                role="listitem"
                aria-setsize={probes.length}
                aria-posinset={item.index + 1}
                style={{ height: item.size, transform: `translateY(${item.start}px)` }}
                className={clsx(COLUMNS, "absolute inset-x-0 top-0 border-b border-rule px-3 text-[0.9375rem]")}
              >
                <ProbeLine line={line} points={points} />
              </div>
            )
          );
        })}
      </div>
    </div>
  );
}

function ProbeLine({
  line: { number, probe, said, tone },
  points,
}: {
  line: ListedProbe;
  points: readonly RoundPoint[];
}) {
  const [a, b] = [points[probe.a], points[probe.b]];
  return (
    <>
      <span className="mono text-right text-xs text-ink-soft">{number + 1}</span>
      <span className="mono min-w-0 truncate text-sm font-semibold">
        {a?.name} <span aria-hidden="true">{sign(probe)}</span>
        <span className="sr-only">{probe.expect === "joined" ? "joined with" : "apart from"}</span> {b?.name}
      </span>
      <span className="mono min-w-0 truncate text-sm text-ink-soft max-sm:hidden">{netsOf(a, b)}</span>
      <span
        className={clsx(
          "truncate text-right text-sm",
          tone === "failed" ? "font-semibold text-failed" : "text-ink-soft",
        )}
      >
        {said ?? (probe.expect === "joined" ? "should beep" : "silent")}
      </span>
    </>
  );
}

const sign = ({ expect }: RoundProbe) => (expect === "joined" ? "↔" : "∤");

function netsOf(a: RoundPoint | undefined, b: RoundPoint | undefined): string {
  const [one, other] = [a?.net || "no net", b?.net || "no net"];
  return one === other ? one : `${one} / ${other}`;
}
