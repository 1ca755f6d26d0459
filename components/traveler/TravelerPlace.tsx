"use client";

import { useState } from "react";
import { STAGES, stageName } from "@/lib/procedure/stages";
import type { Stage } from "@/db/schema/procedures";
import type { CheckView, TravelerView } from "@/lib/traveler/traveler-view";
import { CheckDetail } from "./CheckDetail";
import { CheckRow } from "./CheckRow";
import { countsShort } from "./counts-sentence";
import { DetailFrame } from "./DetailFrame";
import { FilterBar, type Filter } from "./FilterBar";
import { RetiredChecks } from "./RetiredChecks";
import type { TravelerFrame } from "./traveler-acts";
import { useOpenCheck } from "./use-open-check";
import { useRowWalk } from "./use-row-walk";

const ATTENTION = new Set(["failed", "reopened", "doubtful"]);

type Props = { traveler: TravelerView; frame: TravelerFrame; openCheck: string | undefined };

/** Every check of the unit by stage; the open one with its whole history beside it. */
export function TravelerPlace({ traveler, frame, openCheck }: Props) {
  const [filter, setFilter] = useState<Filter>("all");
  const all = [...traveler.checks, ...traveler.retired];
  const { openId, open } = useOpenCheck(openCheck);
  const current = all.find((check) => check.id === openId);
  const shown = traveler.checks.filter((check) => fits(check, filter));
  useRowWalk(
    shown.map((check) => check.id),
    openId,
    open,
  );
  const present = STAGES.map(({ id }) => id).filter((stage) => traveler.checks.some((check) => check.stage === stage));
  return (
    <div className="grid items-start gap-6 lg:grid-cols-[minmax(0,1fr)_24rem]">
      <div className="min-w-0">
        <FilterBar
          filter={filter}
          onFilter={setFilter}
          stages={present}
          attention={traveler.checks.filter((check) => ATTENTION.has(check.state)).length}
        />
        <div className="border-rule bg-sheet rounded-lg border">
          {shown.length === 0 && (
            <p className="text-ink-soft p-5">No check needs attention. Everything that was done holds.</p>
          )}
          {present.map((stage) => (
            <StageSection
              key={stage}
              stage={stage}
              every={traveler.checks.filter((check) => check.stage === stage)}
              shown={shown.filter((check) => check.stage === stage)}
              openId={openId}
              onOpen={open}
              frame={frame}
            />
          ))}
        </div>
        <RetiredChecks checks={traveler.retired} openId={openId} onOpen={open} frame={frame} />
      </div>
      <DetailFrame title={current?.title} onClose={() => open(undefined)}>
        {current ? (
          <CheckDetail
            key={current.id}
            check={current}
            board={traveler.board}
            isRetired={traveler.retired.includes(current)}
            frame={frame}
          />
        ) : (
          <p className="text-ink-soft p-5 text-sm">
            Choose a check to see its whole history: every attempt, who, with what, and why it stands as it does. j and
            k walk the rows.
          </p>
        )}
      </DetailFrame>
    </div>
  );
}

function fits(check: CheckView, filter: Filter): boolean {
  if (filter === "all") return true;
  if (filter === "attention") return ATTENTION.has(check.state);
  return check.stage === filter;
}

type SectionProps = {
  stage: Stage;
  every: CheckView[];
  shown: CheckView[];
  openId: string | undefined;
  onOpen: (id: string) => void;
  frame: TravelerFrame;
};

function StageSection({ stage, every, shown, openId, onOpen, frame }: SectionProps) {
  if (shown.length === 0) return null;
  return (
    <section aria-labelledby={`stage-${stage}`}>
      <h2 id={`stage-${stage}`} className="flex flex-wrap items-baseline gap-x-3 px-4 pt-5 pb-2 text-xl sm:px-5">
        {stageName(stage)}
        <span className="text-ink-soft font-text text-sm font-normal tracking-normal">
          {countsShort(every.map((check) => check.state))}
        </span>
      </h2>
      <ul>
        {shown.map((check) => (
          <CheckRow
            key={check.id}
            check={check}
            isOpen={check.id === openId}
            onOpen={onOpen}
            zone={frame.zone}
            rule={frame.rule}
          />
        ))}
      </ul>
    </section>
  );
}
