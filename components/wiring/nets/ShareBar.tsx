import clsx from "clsx";
import type { LevelLoad } from "@/lib/calc/levels";
import { threeDigits } from "./three-digits";

const amps = (value: number) => threeDigits(value, "A");

/** Used of available: a bar, and the figures, which say the same. */
export function ShareBar({ label, load: { usedA, availableA, holds } }: { label: string; load: LevelLoad }) {
  const share = availableA > 0 ? usedA / availableA : Number.POSITIVE_INFINITY;
  const percent = Math.min(share, 1) * 100;
  return (
    <div className="min-w-0">
      <p className="flex items-baseline justify-between gap-3 text-sm">
        <span className="text-ink-soft">{label}</span>
        <span className={clsx("mono", holds ? "" : "font-semibold text-failed")}>
          {amps(usedA)} <span className="text-ink-soft">of {amps(availableA)}</span>
        </span>
      </p>
      <span aria-hidden="true" className="mt-1 block h-2.5 border border-rule-strong bg-raised">
        <span
          className={clsx("block h-full", holds ? "bg-ink-soft" : "bg-failed")}
          style={{ width: usedA > 0 ? `max(2px, ${percent}%)` : 0 }}
        />
      </span>
      {!holds && <p className="mt-1 text-sm font-semibold text-failed">more than it bears</p>}
    </div>
  );
}
