import { Notice } from "@/components/ui/Notice";
import { counted } from "@/components/workshop/counted";
import type { Pace } from "@/lib/probing/own-pace";
import type { PlanFigures as Figures } from "@/lib/probing/round-view";
import { timeWords } from "./time-words";

type Props = { figures: Figures; count: number; pace?: Pace };

/** How much there is to probe, what that saves, how long it takes, and what one must know before. */
export function PlanFigures({ figures: { counts, everyPair, saved, travelMm, caution, remarks }, count, pace }: Props) {
  return (
    <div className="flex flex-col gap-4">
      <dl className="grid grid-cols-2 gap-x-6 gap-y-3 sm:flex sm:flex-wrap sm:gap-x-8">
        <Figure
          name="probes"
          value={count.toLocaleString("en-GB")}
          note={`${counted(counts.nets, "net")}, ${counted(counts.points, "point")}`}
        />
        <Figure
          name="should beep"
          value={counts.continuity.toLocaleString("en-GB")}
          note="one less than its points for a net"
        />
        <Figure
          name="should be silent"
          value={counts.isolation.toLocaleString("en-GB")}
          note={`instead of ${everyPair.toLocaleString("en-GB")} pairs: ${saved.toLocaleString("en-GB")} saved`}
        />
        {pace && (
          <Figure
            name="takes"
            value={timeWords(count * pace.secondsEach)}
            note={`${pace.isOwn ? "at your own pace," : "guessed at"} ${pace.secondsEach.toFixed(pace.secondsEach < 10 ? 1 : 0)} s each`}
          />
        )}
        {travelMm !== null && travelMm > 0 && (
          <Figure name="way of the probes" value={`${(travelMm / 1000).toFixed(1)} m`} note="both tips together" />
        )}
      </dl>
      {caution && (
        <Notice kind="caution" title="There are parts on this board">
          <p>{caution}</p>
          <p>Anything that carries mains is not for this: local electrical codes and licensed practice come first.</p>
        </Notice>
      )}
      {remarks.length > 0 && (
        <ul className="max-w-prose list-disc pl-5 text-sm text-ink-soft">
          {remarks.map((remark) => (
            <li key={remark}>{remark}</li>
          ))}
        </ul>
      )}
    </div>
  );
}

function Figure({ name, value, note }: { name: string; value: string; note: string }) {
  return (
    <div className="min-w-0">
      <dt className="text-sm text-ink-soft">{name}</dt>
      <dd>
        <span className="mono text-xl font-semibold">{value}</span>
        <span className="block text-sm text-ink-soft">{note}</span>
      </dd>
    </div>
  );
}
