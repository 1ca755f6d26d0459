import clsx from "clsx";
import { LimitBar } from "@/components/ui/glyphs/LimitBar";
import { StateGlyph } from "@/components/ui/glyphs/StateGlyph";
import { DateTime } from "@/components/ui/DateTime";
import type { CheckState } from "@/db/schema/travelers";
import { drawnLimits } from "@/lib/check-kinds/reading-limits";
import type { AttemptView, CheckView } from "@/lib/traveler/traveler-view";
import { RowNotices } from "./RowNotices";

type Props = {
  check: CheckView;
  isOpen: boolean;
  onOpen: (id: string) => void;
  zone: string;
  rule: "simple" | "guarded";
};

const BARS: Partial<Record<CheckState, string>> = {
  failed: "border-l-failed",
  reopened: "border-l-reopened",
  doubtful: "border-l-doubtful",
  conceded: "border-l-conceded",
};

/** One check in one line, as on a paper traveler: state, what, last reading against its limits, when and who. */
export function CheckRow({ check, isOpen, onOpen, zone, rule }: Props) {
  const last = check.attempts.find((attempt) => !attempt.voided);
  return (
    <li
      id={`check-${check.id}`}
      className={clsx(
        "border-rule scroll-mt-24 border-t border-l-4",
        BARS[check.state] ?? "border-l-transparent",
        isOpen && "bg-copper-ground/60",
      )}
    >
      <button
        type="button"
        data-check-row
        aria-expanded={isOpen}
        onClick={() => onOpen(check.id)}
        className={clsx(
          "grid w-full grid-cols-[2rem_minmax(0,1fr)] items-center gap-x-3 gap-y-1.5 py-2.5 pr-4 pl-3 text-left leading-snug sm:pr-5 sm:pl-4",
          "md:min-h-14 md:grid-cols-[2rem_minmax(0,1fr)_8.5rem_9rem_7.5rem]",
          !isOpen && "hover:bg-copper-ground/40",
        )}
      >
        <StateGlyph
          state={check.state}
          label={check.insideGuardBand ? `${check.state}, inside the guard band` : check.state}
          size={16}
        />
        <span className="min-w-0">
          {check.title}
          {check.holdPoint && (
            <span className="text-copper ml-2 text-sm font-semibold whitespace-nowrap">hold point</span>
          )}
        </span>
        <LastReading check={check} last={last} rule={rule} />
        <span className="text-ink-soft max-md:col-start-2 md:text-right md:text-sm">
          {last && (
            <span className="text-sm">
              <DateTime at={last.performedAt} zone={zone} form="short" />
              <span className="md:block"> {last.by.name}</span>
            </span>
          )}
        </span>
      </button>
      <RowNotices check={check} />
    </li>
  );
}

function LastReading({ check, last, rule }: { check: CheckView; last: AttemptView | undefined; rule: Props["rule"] }) {
  const reading = last?.readings.length === 1 ? last.readings[0] : undefined;
  const wrong = last?.verdict === "does-not-conform";
  const figure = (
    <span className={clsx("mono font-semibold max-md:col-start-2 md:text-right", wrong ? "text-failed" : "text-ink")}>
      {last?.summary ?? ""}
    </span>
  );
  if (!reading) {
    return (
      <>
        {figure}
        <span className="text-ink-soft text-sm max-md:col-start-2">{check.expectation}</span>
      </>
    );
  }
  return (
    <>
      {figure}
      <span className="block max-md:col-start-2 max-md:max-w-56">
        <LimitBar
          {...drawnLimits(reading, reading.unit, reading.expandedUncertainty, rule)}
          format={undefined}
          value={Number.isFinite(reading.value) ? reading.value : undefined}
        />
        <span className="text-ink-soft mono block text-xs">{check.expectation}</span>
      </span>
    </>
  );
}
