"use client";

import clsx from "clsx";
import { useQueryState } from "nuqs";
import { useState } from "react";
import { Panel } from "@/components/ui/Panel";
import { SearchField } from "@/components/ui/SearchField";
import { gateFunctionName, LOGIC_PARTS, partLabel, type LogicPart } from "@/lib/calc/logic-parts";
import { LogicSheet } from "./LogicSheet";

type Entry = { key: string; part: LogicPart; isOwn: boolean; found: string };

const entryOf = (part: LogicPart, isOwn: boolean): Entry => ({
  key: isOwn ? `own ${part.number}` : part.number,
  part,
  isOwn,
  found: [
    partLabel(part, ""),
    part.number,
    part.name,
    gateFunctionName(part.gateFunction),
    part.gateFunction,
    isOwn ? "own" : "",
  ]
    .join(" ")
    .toLowerCase(),
});
const BUILT_IN = LOGIC_PARTS.map((part) => entryOf(part, false));

/** A list to search and one sheet beside it; on a phone the sheet opens under its line. */
export function LogicList({ own }: { own: readonly LogicPart[] }) {
  const [wanted, setWanted] = useState("");
  const [shown, setShown] = useQueryState("part", { defaultValue: "", history: "replace" });
  const entries = [...own.map((part) => entryOf(part, true)), ...BUILT_IN];
  const words = wanted.toLowerCase().replace("…", "").split(/\s+/).filter(Boolean);
  const hits = entries.filter(({ found }) => words.every((word) => found.includes(word)));
  const open = hits.find(({ key }) => key === shown);
  const beside = open ?? hits[0];
  return (
    <div className="grid items-start gap-5 lg:grid-cols-[minmax(0,22rem)_minmax(0,1fr)]">
      <Panel padding="none" className="lg:max-h-[calc(100dvh-8rem)] lg:overflow-y-auto">
        <div className="sticky top-0 z-10 border-b border-rule bg-sheet p-3">
          <SearchField label="Number or what it does" value={wanted} onChange={setWanted} />
          <p role="status" className="mt-1.5 px-1 text-sm text-ink-soft">
            {hits.length === entries.length ? `${hits.length} parts` : `${hits.length} of ${entries.length} parts`}
          </p>
        </div>
        {hits.length === 0 && (
          <p className="px-4 py-5 text-ink-soft">
            Nothing matches “{wanted}”. Write it down as a part of your own below.
          </p>
        )}
        <ul>
          {hits.map(({ key, part, isOwn }) => {
            const isOpen = key === open?.key;
            const isBeside = key === beside?.key;
            return (
              <li key={key} className="border-b border-rule last:border-b-0">
                <button
                  type="button"
                  aria-expanded={isOpen || isBeside}
                  onClick={() => void setShown(isOpen ? null : key)}
                  className={clsx(
                    "relative grid w-full grid-cols-[5.5rem_minmax(0,1fr)] gap-2 px-4 py-2 text-left outline-offset-[-2px] hover:bg-raised",
                    isBeside && "lg:bg-copper-ground lg:hover:bg-copper-ground",
                  )}
                >
                  <span className="mono text-sm leading-6">{partLabel(part, "…")}</span>
                  <span>
                    {part.name}
                    <span className="block text-sm text-ink-soft">
                      {isOwn ? "own: " : ""}
                      {part.gatesPerPackage} × {gateFunctionName(part.gateFunction)}
                    </span>
                  </span>
                </button>
                {isOpen && (
                  <div className="border-t border-rule bg-raised px-4 py-4 lg:hidden">
                    <LogicSheet part={part} isOwn={isOwn} />
                  </div>
                )}
              </li>
            );
          })}
        </ul>
      </Panel>
      {beside && (
        <Panel className="hidden lg:sticky lg:top-4 lg:block">
          <LogicSheet part={beside.part} isOwn={beside.isOwn} />
        </Panel>
      )}
    </div>
  );
}
