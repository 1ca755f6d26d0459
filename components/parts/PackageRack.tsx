"use client";

import clsx from "clsx";
import { useState } from "react";
import { LOGIC_PARTS, partLabel, type LogicPart } from "@/lib/calc/logic-parts";
import type { PlacedPackage, SpareGate } from "@/lib/calc/packing";
import { PackageDrawing } from "./PackageDrawing";

type Props = {
  packages: readonly PlacedPackage[];
  spares: readonly SpareGate[];
  /** Parts by gate function, for the number of pins. */
  parts?: Record<string, LogicPart>;
};

/** The board's packages in their order. Choosing one says which gate is used by what, and which is free. */
export function PackageRack({ packages, spares, parts = {} }: Props) {
  const [chosen, setChosen] = useState<string>();
  const shown = packages.find(({ designator }) => designator === chosen);
  const ofPackage = (designator: string) => spares.filter((spare) => spare.designator === designator);
  return (
    <div className="flex flex-col gap-3">
      <ul className="grid-paper flex flex-wrap items-end gap-x-4 gap-y-3.5 rounded-md border border-rule p-3.5 print:border-0">
        {packages.map((one) => {
          const own = ofPackage(one.designator);
          const used = one.gates.length - own.length;
          return (
            <li key={one.designator} className="max-w-full">
              <button
                type="button"
                aria-pressed={chosen === one.designator}
                aria-label={`${one.designator}, ${one.part}: ${used} of ${one.gates.length} gates used`}
                onClick={() => setChosen(chosen === one.designator ? undefined : one.designator)}
                className={clsx(
                  "flex max-w-full flex-col rounded bg-sheet px-1 py-0.5 outline-offset-1",
                  chosen === one.designator ? "shadow-[0_0_0_2px_var(--copper)]" : "hover:bg-raised",
                )}
              >
                <span className="flex w-full justify-between gap-3 text-2xs">
                  <span className="mono font-semibold">{one.designator}</span>
                  <span className="mono text-ink-soft">{one.part}</span>
                </span>
                <PackageDrawing one={one} pins={pinsOf(one, parts)} spares={own} />
              </button>
            </li>
          );
        })}
      </ul>
      <div aria-live="polite" className="text-[0.9375rem] print:hidden">
        {shown ? (
          <Gates one={shown} spares={ofPackage(shown.designator)} />
        ) : (
          <p className="text-sm text-ink-soft">
            Filled gates are used, open ones are spare. Choose a package to see which gate does what.
          </p>
        )}
      </div>
    </div>
  );
}

function Gates({ one, spares }: { one: PlacedPackage; spares: readonly SpareGate[] }) {
  return (
    <div>
      <p className="font-semibold">
        <span className="mono text-sm">{one.designator}</span> <span className="mono text-sm">{one.part}</span>
      </p>
      <ul className="mt-0.5 flex flex-wrap gap-x-6 gap-y-0.5">
        {one.gates.map(({ gate, inputs, outputs, usedBy }) => (
          <li key={gate}>
            <span className="mono text-sm font-semibold">{gate}</span>{" "}
            {usedBy ?? <span className="font-semibold text-copper">spare</span>}
            {inputs && outputs && (
              <span className="mono text-xs text-ink-soft">
                {" "}
                {inputs.join(" ")} → {outputs.join(" ")}
              </span>
            )}
          </li>
        ))}
      </ul>
      {spares.length > 0 && <p className="text-sm text-ink-soft">{spares.map(({ sentence }) => sentence).join(" ")}</p>}
    </div>
  );
}

function pinsOf({ part, gateFunction, gates }: PlacedPackage, parts: Record<string, LogicPart>): number {
  const known = parts[gateFunction] ?? LOGIC_PARTS.find((logic) => part === partLabel(logic, familyIn(part)));
  return known?.pins ?? Math.max(8, gates.length * 3 + 2);
}

const familyIn = (part: string) => /^74([A-Z]*)/.exec(part)?.[1] ?? "";
