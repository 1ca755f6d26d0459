"use client";

import { useState } from "react";
import { Button } from "@/components/ui/Button";
import { Notice } from "@/components/ui/Notice";
import { Panel } from "@/components/ui/Panel";
import { counted } from "@/components/workshop/counted";
import type { Judged } from "@/lib/pin-map-file/judge-rows";

const FEW = 12;
const STEP = 100;

/** Rows that cannot be taken, each with its line and the reason; and pins that were written in another case. */
export function WhatCannot({ judged: { bad, recased } }: { judged: Judged }) {
  const [most, setMost] = useState(FEW);
  const shown = bad.slice(0, most);
  return (
    <>
      {bad.length > 0 && (
        <Panel title={`${counted(bad.length, "row")} cannot be taken`}>
          <ul className="flex flex-col">
            {shown.map(({ line, sentence }) => (
              <li
                key={line}
                className="grid grid-cols-[4.5rem_minmax(0,1fr)] gap-x-3 border-b border-rule py-2 text-[0.9375rem] first:pt-0 last:border-b-0"
              >
                <span className="mono pt-0.5 text-sm font-semibold text-failed">line {line}</span>
                <span className="max-w-prose">{sentence}</span>
              </li>
            ))}
          </ul>
          {bad.length > shown.length && (
            <Button size="sm" className="mt-2" onPress={() => setMost(most + STEP)}>
              Show {Math.min(STEP, bad.length - shown.length)} more of {bad.length - shown.length}
            </Button>
          )}
          <p className="mt-3 text-sm text-ink-soft">
            Mend them in the spreadsheet and open the file again, or leave them out below.
          </p>
        </Panel>
      )}
      {recased.length > 0 && (
        <Notice kind="info">
          <p>
            {counted(recased.length, "pin is", "pins are")} written in another case in the file and{" "}
            {recased.length === 1 ? "is" : "are"} taken as the connector names {recased.length === 1 ? "it" : "them"}:{" "}
            <span className="mono text-sm">
              {recased
                .slice(0, FEW)
                .map(({ written, name }) => `${written} → ${name}`)
                .join(", ")}
              {recased.length > FEW && " …"}
            </span>
          </p>
        </Notice>
      )}
    </>
  );
}
