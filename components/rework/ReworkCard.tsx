"use client";

import Link from "next/link";
import type { EvidenceActions } from "@/components/evidence/use-evidence-acts";
import { CarryOver } from "./CarryOver";
import { DateTime } from "@/components/ui/DateTime";
import { StateGlyph } from "@/components/ui/glyphs/StateGlyph";
import { Disclosure } from "@/components/workshop/Disclosure";
import { TOUCH_KINDS } from "@/lib/rework/schema";
import { nameRework, TOUCH_LABELS, wireWords } from "@/lib/rework/rework-words";
import type { ReworkDoubtView, ReworkView } from "@/lib/rework/rework-view";
import { ReworkPictures } from "./ReworkPictures";

type Props = {
  project: string;
  zone: string;
  serial: string;
  rework: ReworkView;
  /** Its open doubts are shown at once. */
  isNewest: boolean;
  /** Units that it can be carried over to; empty for those who may not. */
  others: readonly string[];
  evidence: EvidenceActions | undefined;
};

/** One rework: what was done and why, what it touches, what it put in doubt and what of that is repeated. */
export function ReworkCard({ project, zone, serial, rework, isNewest, others, evidence }: Props) {
  const { number, wire, fault, carriedFrom, doubts, spared } = rework;
  const units = `/projects/${project}/units`;
  const open = doubts.filter(({ isAnswered, isRetired }) => !isAnswered && !isRetired);
  return (
    <article id={`R${number}`} className="target:bg-copper-ground/40 scroll-mt-6 px-4 py-4 sm:px-5">
      <header className="flex flex-wrap items-baseline justify-between gap-x-4 gap-y-1">
        <h3 className="text-lg">
          <span className="mono text-ink-soft mr-1.5 text-[0.85em] font-normal">R{number}</span> {nameRework(rework)}
        </h3>
        <p className="text-ink-soft text-sm">
          {rework.by.name}, <DateTime at={rework.performedAt} zone={zone} />
        </p>
      </header>
      <div className="mt-1 grid gap-1.5">
        {wire && <p className="mono text-[0.9375rem]">{wireWords(wire)}</p>}
        <p>{rework.what}</p>
        {rework.why && <p className="text-ink-soft whitespace-pre-line">{rework.why}</p>}
        <Touched rework={rework} />
        {(fault || carriedFrom) && (
          <p className="text-sm">
            {fault && (
              <>
                For{" "}
                <Link href={`/projects/${project}/faults/${fault.number}`} className="link" prefetch={false}>
                  F{fault.number} {fault.title}
                </Link>
                .{" "}
              </>
            )}
            {carriedFrom && (
              <>
                Carried over from{" "}
                <Link
                  href={`${units}/${encodeURIComponent(carriedFrom.serial)}/reworks#R${carriedFrom.number}`}
                  className="link"
                  prefetch={false}
                >
                  R{carriedFrom.number} of {carriedFrom.serial}
                </Link>
                .
              </>
            )}
          </p>
        )}
        <p className="text-sm font-semibold">{standing(doubts.length, open.length)}</p>
        {open.length > 0 && (
          <Disclosure summary={open.length === 1 ? "Which one" : "Which ones"} isOpen={isNewest}>
            <Doubts {...{ project, serial }} doubts={open} />
          </Disclosure>
        )}
        {doubts.length + spared.length > open.length && (
          <Disclosure summary={settledWords(doubts.length - open.length, spared.length)}>
            <Doubts {...{ project, serial }} doubts={doubts.filter((doubt) => !open.includes(doubt))} />
            {spared.length > 0 && (
              <>
                <h4 className="mt-3 mb-1 text-sm font-semibold">Spared</h4>
                <Doubts {...{ project, serial }} doubts={spared} isSpared />
              </>
            )}
          </Disclosure>
        )}
        <ReworkPictures {...{ project, zone, rework, evidence }}>
          {others.length > 0 && <CarryOver {...{ project, others }} rework={rework} />}
        </ReworkPictures>
      </div>
    </article>
  );
}

function Touched({ rework }: { rework: ReworkView }) {
  const groups = TOUCH_KINDS.flatMap((kind) => {
    const names = rework.touches.filter((touch) => touch.kind === kind).map(({ name }) => name);
    return names.length === 0 ? [] : [{ kind, names }];
  });
  return (
    <p className="text-ink-soft flex flex-wrap gap-x-3 text-sm">
      {groups.map(({ kind, names }) => (
        <span key={kind}>
          {TOUCH_LABELS[kind]} <span className="mono text-ink text-xs">{names.join(", ")}</span>
        </span>
      ))}
    </p>
  );
}

type DoubtsProps = { project: string; serial: string; doubts: readonly ReworkDoubtView[]; isSpared?: boolean };

function Doubts({ project, serial, doubts, isSpared = false }: DoubtsProps) {
  return (
    <ul className="grid gap-1 text-sm">
      {doubts.map((doubt) => (
        <li key={doubt.checkId} className="grid grid-cols-[1.5rem_minmax(0,1fr)] gap-x-1.5">
          <StateGlyph
            state={doubt.isRetired || isSpared ? "waiting" : doubt.isAnswered ? "passed" : "doubtful"}
            label={isSpared ? "spared" : doubt.isRetired ? "retired" : doubt.isAnswered ? "repeated" : "in doubt"}
            size={12}
            className="mt-1"
          />
          <span>
            <Link
              href={`/projects/${project}/units/${encodeURIComponent(doubt.serial)}?check=${doubt.checkId}#check-${doubt.checkId}`}
              className="link"
              prefetch={false}
            >
              {doubt.title}
            </Link>
            {doubt.serial !== serial && ` of ${doubt.serial}`}
            {isSpared && <span className="text-ink-soft">: {doubt.reason}</span>}
          </span>
        </li>
      ))}
    </ul>
  );
}

const checks = (count: number) => `${count} ${count === 1 ? "check" : "checks"}`;

function standing(all: number, open: number): string {
  if (all === 0) return "It put nothing in doubt.";
  if (open === 0) return `It put ${checks(all)} in doubt; ${all === 1 ? "it is" : "all are"} repeated.`;
  return open === all
    ? `It put ${checks(all)} in doubt; none is repeated yet.`
    : `It put ${checks(all)} in doubt; ${open} ${open === 1 ? "waits" : "wait"} to be repeated.`;
}

function settledWords(settled: number, spared: number): string {
  return [settled > 0 ? `${settled} repeated` : "", spared > 0 ? `${spared} spared` : ""].filter(Boolean).join(", ");
}
