"use client";

import { useEffect, useRef, useState } from "react";
import { isTyping } from "@/components/bench/key-map";
import { useBenchKeys } from "@/components/bench/use-bench-keys";
import { useReadAloud } from "@/components/bench/use-read-aloud";
import { ButtonLink } from "@/components/ui/ButtonLink";
import type { RoundView } from "@/lib/probing/round-view";
import { AnswerPanel } from "./AnswerPanel";
import { PairBody } from "./PairBody";
import { ProbeKeys } from "./ProbeKeys";
import { ProbeTop } from "./ProbeTop";
import { spokenPair } from "./spoken-pair";
import { useProbing } from "./use-probing";

type Props = { round: RoundView; project: string; viewer: { id: string }; mayProbe: boolean };

/** One pair a screen. Everything said is on the server a moment later: another device goes on where this one stopped. */
export function ProbeScreen({ round, project, viewer, mayProbe }: Props) {
  const probing = useProbing({ project, round, userId: viewer.id });
  const [isShowingKeys, setShowingKeys] = useState(false);
  const field = useRef<HTMLInputElement>(null);
  const { current, probe, answer, back, next, setTyped, results, answered, total, wrong } = probing;
  const isOpen = mayProbe && !results.isClosed;
  const [a, b] = [probe && round.points[probe.a], probe && round.points[probe.b]];
  const reading = useReadAloud(isOpen && probe && a && b ? spokenPair(probe, a, b) : "");
  const roundHref = `/projects/${project}/units/${encodeURIComponent(round.unit.serial)}/probing/${round.id}`;

  useBenchKeys((key) => {
    if (key === "keys") setShowingKeys((before) => !before);
    else if (!isOpen) return;
    else if (key === "conforms" || key === "record") answer({ beeps: true });
    else if (key === "does-not-conform") answer({ beeps: false });
    else if (key === "previous") back();
    else if (key === "next" || key === "note") next();
  });

  useEffect(() => {
    // A figure begins the resistance, wherever the focus is.
    const begin = (event: KeyboardEvent) => {
      const target = event.target instanceof HTMLElement ? event.target : null;
      const isPlain = !event.ctrlKey && !event.metaKey && !event.altKey;
      if (!isPlain || !/^[0-9.,]$/.test(event.key) || (target && isTyping(target))) return;
      if (document.querySelector("dialog[open]")) return;
      event.preventDefault();
      setTyped(event.key);
      field.current?.focus();
    };
    addEventListener("keydown", begin);
    return () => removeEventListener("keydown", begin);
  }, [setTyped]);

  useEffect(() => {
    // The answer was taken: the keys are the bench's again, not the field's.
    field.current?.blur();
  }, [current]);

  return (
    <div className="flex h-dvh flex-col bg-sheet">
      <ProbeTop probing={probing} serial={round.unit.serial} about={round.about} roundHref={roundHref} />
      {answered >= total && total > 0 && (
        <div className="border-b border-rule bg-passed-ground px-4 py-3">
          <div className="mx-auto flex max-w-5xl flex-wrap items-center justify-between gap-3">
            <p className="text-lg font-semibold">
              Every pair here has its answer. {wrong === 0 ? "All as expected." : `${wrong} not as expected.`}
            </p>
            <ButtonLink kind="primary" href={roundHref}>
              See what it comes to
            </ButtonLink>
          </div>
        </div>
      )}
      <div className="mx-auto flex min-h-0 w-full max-w-5xl flex-1 flex-col lg:grid lg:grid-cols-[minmax(0,1fr)_24rem]">
        <PairBody round={round} probing={probing} />
        {isOpen ? (
          <AnswerPanel probing={probing} field={field} reading={reading} onKeys={() => setShowingKeys(true)} />
        ) : (
          <p className="border-t border-rule p-4 text-ink-soft">
            {results.isClosed ? "This round is closed." : "You can look on. Builders and maintainers probe."}
          </p>
        )}
      </div>
      {isShowingKeys && <ProbeKeys onClose={() => setShowingKeys(false)} />}
    </div>
  );
}
