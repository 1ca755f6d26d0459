import { StateGlyph } from "@/components/ui/glyphs/StateGlyph";
import type { AttemptView } from "@/lib/traveler/traveler-view";
import { VERDICTS } from "@/lib/check-kinds/verdict-word";
import type { OnTheWay } from "./on-the-way";
import { dayAndTime } from "./day-and-time";

const SHOWN = 3;

type Props = { attempts: readonly AttemptView[]; coming: readonly OnTheWay[]; historyHref: string; zone: string };

/** What was found before, newest first; what is still on its way stands on top and says so. */
export function LastAttempts({ attempts, coming, historyHref, zone }: Props) {
  if (attempts.length === 0 && coming.length === 0) return null;
  return (
    <section aria-label="Last attempts" className="border-rule border-t pt-3">
      <h3 className="text-ink-soft font-text text-sm font-normal">Last attempts</h3>
      <ul className="mt-1 grid gap-1.5">
        {coming.toReversed().map((attempt) => (
          <li key={attempt.id} className="flex items-center gap-2">
            <StateGlyph state={VERDICTS[attempt.verdict].state} label={VERDICTS[attempt.verdict].word} size={12} />
            <span className="mono">{attempt.summary}</span>
            <span className="text-doubtful motion-wait text-sm">{attempt.arrived ? "recorded" : "sending"}</span>
          </li>
        ))}
        {attempts.slice(0, SHOWN).map((attempt) => (
          <li key={attempt.id} className="flex flex-wrap items-center gap-x-2">
            <StateGlyph state={VERDICTS[attempt.verdict].state} label={VERDICTS[attempt.verdict].word} size={12} />
            <span className={attempt.voided ? "mono text-ink-soft line-through" : "mono"}>{attempt.summary}</span>
            <span className="text-ink-soft text-sm">
              {attempt.by.name}, {dayAndTime(attempt.performedAt, zone)}
              {attempt.voided && `, voided: ${attempt.voided.reason}`}
            </span>
            {attempt.note && <span className="text-ink-soft w-full pl-7 text-sm">{attempt.note}</span>}
          </li>
        ))}
      </ul>
      <a href={historyHref} className="link mt-2 inline-block py-1 text-sm">
        Whole history of this check
      </a>
    </section>
  );
}
