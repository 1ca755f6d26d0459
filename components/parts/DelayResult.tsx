import type { ReactNode } from "react";
import type { WorkedOut } from "@/lib/delay-path/work-out";
import { windowLimits } from "@/lib/delay-path/window-limits";
import { DelayBars } from "./DelayBars";
import { DelaySteps } from "./DelaySteps";

/** What a path comes to: sums named as what they are, the highest clock, what a capture may show, and what is assumed. */
export function DelayResult({ worked }: { worked: Extract<WorkedOut, { ok: true }> }) {
  const { delay, window, clock } = worked;
  const limits = windowLimits(window);
  return (
    <div className="flex flex-col gap-4">
      <DelayBars delay={delay} />
      <DelaySteps worked={worked} />
      <dl className="flex flex-col gap-1.5 text-[0.9375rem]">
        {clock && <Line name="Clock">{clock.sentences.join(" ")}</Line>}
        <Line name="A capture may show">
          <span className="mono text-sm font-semibold">{limits ?? "anything"}</span>
          <span className="block text-sm text-ink-soft">{window.rule}</span>
        </Line>
      </dl>
      {delay.notes.length > 0 && (
        <ul className="flex flex-col gap-0.5 text-sm text-ink-soft">
          {delay.notes.map((note) => (
            <li key={note}>{note}</li>
          ))}
        </ul>
      )}
    </div>
  );
}

const Line = ({ name, children }: { name: string; children: ReactNode }) => (
  <div className="sm:grid sm:grid-cols-[11rem_minmax(0,1fr)] sm:gap-4">
    <dt className="text-ink-soft">{name}</dt>
    <dd>{children}</dd>
  </div>
);
