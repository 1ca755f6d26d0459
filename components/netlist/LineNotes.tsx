"use client";

import { useState } from "react";
import { Button } from "@/components/ui/Button";
import type { LineNote } from "@/lib/calc/netlist";

const FEW = 8;
const STEP = 100;

/** Lines of a file, each with what became of it. */
export function LineNotes({ notes, tone }: { notes: readonly LineNote[]; tone: "failed" | "doubtful" }) {
  const [most, setMost] = useState(FEW);
  const shown = notes.slice(0, most);
  return (
    <>
      <ul className="flex flex-col">
        {shown.map(({ line, reason }, at) => (
          <li
            key={at}
            className="grid grid-cols-[5.5rem_minmax(0,1fr)] gap-x-3 border-b border-rule py-2 text-[0.9375rem] first:pt-0 last:border-b-0"
          >
            <span
              className={`mono pt-0.5 text-sm font-semibold ${tone === "failed" ? "text-failed" : "text-doubtful"}`}
            >
              {line === 0 ? "the file" : `line ${line}`}
            </span>
            <span className="max-w-prose break-words">{reason}</span>
          </li>
        ))}
      </ul>
      {notes.length > shown.length && (
        <Button size="sm" className="mt-2" onPress={() => setMost(most + STEP)}>
          Show {Math.min(STEP, notes.length - shown.length)} more of {notes.length - shown.length}
        </Button>
      )}
    </>
  );
}
