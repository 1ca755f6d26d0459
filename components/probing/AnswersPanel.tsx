"use client";

import { useMemo, useState } from "react";
import { Panel } from "@/components/ui/Panel";
import { RadioGroup } from "@/components/ui/RadioGroup";
import type { RoundView } from "@/lib/probing/round-view";
import { ProbeList, type ListedProbe } from "./ProbeList";
import { isGood, saidWords } from "./said-words";

const FILTERS = ["all", "wrong", "left"] as const;
type Filter = (typeof FILTERS)[number];

/** Every probe with its answer. */
export function AnswersPanel({ round }: { round: RoundView }) {
  const [filter, setFilter] = useState<Filter>("all");
  const { lines, wrong, left } = useMemo(() => listed(round), [round]);
  const shown = { all: lines, wrong, left }[filter];
  return (
    <Panel title="Answers" note={`${lines.length - left.length} of ${lines.length}`}>
      <RadioGroup
        label="Show"
        isInRow
        options={[
          { id: "all", label: `All ${lines.length}` },
          { id: "wrong", label: `Not as expected ${wrong.length}` },
          { id: "left", label: `Left ${left.length}` },
        ]}
        value={filter}
        onChange={(id) => setFilter(FILTERS.find((one) => one === id) ?? "all")}
      />
      <div className="mt-3">
        {shown.length === 0 ? (
          <p className="rounded border border-dashed border-rule-strong px-4 py-5 text-ink-soft">
            {filter === "left" ? "Every probe has its answer." : "Nothing that is not as it should be."}
          </p>
        ) : (
          <ProbeList label="Answers" points={round.points} probes={shown} />
        )}
      </div>
    </Panel>
  );
}

function listed({ probes, results, limits }: RoundView) {
  const said = new Map(results.map((result) => [result.probe, result]));
  const [wrong, left]: [ListedProbe[], ListedProbe[]] = [[], []];
  const lines = probes.map((probe, number): ListedProbe => {
    const result = said.get(number);
    if (!result) {
      const line = { number, probe };
      left.push(line);
      return line;
    }
    const isWrong = !isGood(probe, result, limits);
    const line: ListedProbe = { number, probe, said: saidWords(result), tone: isWrong ? "failed" : undefined };
    if (isWrong) wrong.push(line);
    return line;
  });
  return { lines, wrong, left };
}
