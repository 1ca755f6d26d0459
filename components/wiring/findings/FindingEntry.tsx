import clsx from "clsx";
import type { ReactNode } from "react";
import { Badge } from "@/components/ui/Badge";
import { DateTime } from "@/components/ui/DateTime";
import type { FindingView } from "@/lib/finding/load-findings";
import { PinLinks } from "../PinLinks";
import { WEIGHT_WORDS, WeightMark } from "../WeightMark";

const BARS = { must: "border-l-failed", should: "border-l-doubtful", look: "border-l-conceded" } as const;

type Props = { finding: FindingView; project: string; zone: string; actions: ReactNode };

/** One finding: what, why, how to mend it, where; and who let it stay, when somebody did. */
export function FindingEntry({ finding, project, zone, actions }: Props) {
  const { weight, title, why, mend, pins, boards, accepted } = finding;
  return (
    <article
      className={clsx(
        "grid gap-x-4 gap-y-2 border-b border-l-4 border-b-rule px-3.5 py-3.5 last:border-b-0 sm:px-4 lg:grid-cols-[minmax(0,1fr)_auto]",
        accepted ? "border-l-rule-strong" : BARS[weight],
      )}
    >
      <div className="flex min-w-0 flex-col gap-2">
        <header className="flex gap-2.5">
          <WeightMark weight={weight} className="mt-1" />
          <h3 className="min-w-0 text-pretty text-[1.0625rem] leading-snug">
            {accepted && <span className="sr-only">{WEIGHT_WORDS[weight]}, accepted: </span>}
            {title}
          </h3>
        </header>
        <div className="flex max-w-prose flex-col gap-1 text-[0.9375rem] sm:pl-[1.875rem]">
          <p className="text-ink-soft">{why}</p>
          <p>
            <b className="font-semibold">Mend:</b> {mend}
          </p>
        </div>
        <div className="flex flex-col gap-2 sm:pl-[1.875rem]">
          <PinLinks project={project} pins={pins} />
          {pins.length === 0 && (
            <p className="flex flex-wrap gap-1.5">
              {boards.map((code) => (
                <Badge key={code}>{code}</Badge>
              ))}
            </p>
          )}
          {accepted && (
            <p className="max-w-prose rounded bg-conceded-ground px-3 py-2 text-sm">
              <b className="font-semibold">Accepted</b> by {accepted.by}, <DateTime at={accepted.at} zone={zone} />:{" "}
              <span className="whitespace-pre-line">{accepted.reason}</span>
            </p>
          )}
        </div>
      </div>
      {actions && <div className="flex items-start sm:pl-[1.875rem] lg:pl-0">{actions}</div>}
    </article>
  );
}
