import Link from "next/link";
import { DateTime } from "@/components/ui/DateTime";
import { StateGlyph, type GlyphState } from "@/components/ui/glyphs/StateGlyph";
import type { CheckDoubtView, CheckView, PersonView } from "@/lib/traveler/traveler-view";
import { AttemptEntry } from "./AttemptEntry";
import { historyOf, type HistoryEntry } from "./history-of";
import type { TravelerFrame } from "./traveler-acts";

type Props = { check: CheckView; isRetired: boolean; frame: TravelerFrame };

export function CheckHistory({ check, isRetired, frame }: Props) {
  const entries = historyOf(check);
  return (
    <section aria-label="History">
      <h3 className="text-base">History</h3>
      {entries.length === 0 && (
        <p className="text-ink-soft mt-1 text-sm">
          {isRetired
            ? "Nobody carried it out."
            : "Nobody has carried it out yet. What is recorded at the bench stands here for good."}
        </p>
      )}
      <ol className="mt-2 grid gap-3">
        {entries.map((entry) => (
          <li key={`${entry.kind} ${keyOf(entry)}`} className="border-rule border-t pt-3">
            <Entry entry={entry} check={check} frame={frame} />
          </li>
        ))}
      </ol>
    </section>
  );
}

function keyOf(entry: HistoryEntry): string {
  switch (entry.kind) {
    case "attempt":
      return entry.attempt.id;
    case "reopening":
      return entry.reopening.id;
    case "concession":
      return entry.concession.id;
    case "withdrawal":
      return entry.id;
    case "doubt":
      return entry.doubt.id;
    case "lift":
      return entry.lift.id;
  }
}

function Entry({ entry, check, frame }: Omit<Props, "isRetired"> & { entry: HistoryEntry }) {
  switch (entry.kind) {
    case "attempt":
      return <AttemptEntry attempt={entry.attempt} check={check} frame={frame} />;
    case "reopening":
      return <Decision state="reopened" what="Reopened" {...entry.reopening} zone={frame.zone} />;
    case "concession":
      return <Decision state="conceded" what="Conceded" {...entry.concession} zone={frame.zone} />;
    case "withdrawal":
      return (
        <Decision
          state="failed"
          what="Concession withdrawn"
          by={entry.by}
          at={entry.at}
          reason={entry.reason}
          zone={frame.zone}
        />
      );
    case "doubt":
      return <Reworked doubt={entry.doubt} frame={frame} />;
    case "lift":
      return <Decision state="waiting" what="Hold lifted" {...entry.lift} zone={frame.zone} />;
  }
}

/** What a rework did to the check, with the way to it. */
function Reworked({ doubt, frame }: { doubt: CheckDoubtView; frame: TravelerFrame }) {
  const { rework, serial, number, isSpared, by, at } = doubt;
  // The reason of a doubt begins with the rework that it is of; the link names it already.
  const reason = doubt.reason.startsWith(`${rework}: `) ? doubt.reason.slice(rework.length + 2) : doubt.reason;
  return (
    <div className="grid grid-cols-[1.75rem_1fr] gap-x-2">
      <StateGlyph state={isSpared ? "waiting" : "doubtful"} size={14} className="mt-1" />
      <div className="min-w-0">
        <p>
          <span className="font-semibold">
            {isSpared ? "Spared by " : ""}
            <Link
              href={`/projects/${frame.project}/units/${encodeURIComponent(serial)}/reworks#R${number}`}
              className="link"
              prefetch={false}
            >
              {rework}
            </Link>
            :
          </span>{" "}
          {reason}
        </p>
        <p className="text-ink-soft text-sm">
          {by.name}, <DateTime at={at} zone={frame.zone} />
        </p>
      </div>
    </div>
  );
}

type DecisionProps = { state: GlyphState; what: string; by: PersonView; at: string; reason: string; zone: string };

/** A maintainer's decision, with its reason in full. */
function Decision({ state, what, by, at, reason, zone }: DecisionProps) {
  return (
    <div className="grid grid-cols-[1.75rem_1fr] gap-x-2">
      <StateGlyph state={state} size={14} className="mt-1" />
      <div className="min-w-0">
        <p>
          <span className="font-semibold">{what}:</span> <span className="whitespace-pre-line">{reason}</span>
        </p>
        <p className="text-ink-soft text-sm">
          {by.name}, <DateTime at={at} zone={zone} />
        </p>
      </div>
    </div>
  );
}
