"use client";

import Link from "next/link";
import { useState } from "react";
import type { PinAt } from "@/lib/calc/interconnect";
import { pinAddress } from "./pin-address";

const FEW = 8;

type At = Pick<PinAt, "placement" | "label" | "board" | "connector" | "connectorId" | "pin">;

/** Pins where they stand in the machine, each a way to its row; the many behind a press. */
export function PinLinks({ project, pins }: { project: string; pins: readonly At[] }) {
  const [isAll, setAll] = useState(false);
  const shown = isAll ? pins : pins.slice(0, FEW);
  const hasSeveral =
    new Set(pins.map(({ board, connector }) => `${board} ${connector}`)).size >
    new Set(pins.map(({ board }) => board)).size;
  return (
    <ul aria-label="Pins" className="flex flex-wrap gap-x-1.5 gap-y-1.5">
      {shown.map((pin) => (
        <li key={`${pin.placement} ${pin.connectorId} ${pin.pin}`}>
          <Link
            href={pinAddress(project, pin)}
            className="mono inline-flex min-h-7 items-center gap-1.5 rounded-sm border border-rule-strong bg-raised px-1.5 text-xs no-underline hover:border-copper hover:text-copper"
          >
            <span>{pin.label}</span>
            {hasSeveral && <span className="text-ink-soft">{pin.connector}</span>}
            <span className="font-semibold">{pin.pin}</span>
          </Link>
        </li>
      ))}
      {pins.length > shown.length && (
        <li>
          <button
            type="button"
            onClick={() => setAll(true)}
            className="min-h-7 rounded-sm px-1.5 text-xs font-semibold text-copper hover:underline"
          >
            and {pins.length - shown.length} more
          </button>
        </li>
      )}
    </ul>
  );
}
