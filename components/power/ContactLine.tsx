import type { ContactGroup } from "@/lib/power/contact-groups";
import { DrawBar } from "./DrawBar";
import { amps } from "./figures";
import { VerdictWord } from "./VerdictWord";

const WORDS = { fits: "fits", "too much": "too much", "no contact": "no contact" } as const;

export function ContactLine({ group }: { group: ContactGroup }) {
  const { labels, rail, contacts, perContactA, ratedA, verdict, sentence } = group;
  const fits = verdict === "fits";
  return (
    <li className="grid grid-cols-[minmax(0,1fr)_auto] items-center gap-x-4 gap-y-1 border-t border-rule px-4 py-2 sm:px-5 md:grid-cols-[14rem_minmax(0,1fr)_8.5rem_auto]">
      <span className="min-w-0">
        {labels.join(", ")} <span className="mono text-sm text-ink-soft">{rail}</span>
      </span>
      <span className="col-span-2 row-start-2 min-w-0 md:col-span-1 md:row-start-auto">
        {perContactA === null ? (
          <span className="text-sm">{sentence}</span>
        ) : (
          <DrawBar worst={perContactA} limit={ratedA} tone={fits ? "passed" : "failed"} label={sentence} />
        )}
      </span>
      <span className="text-sm max-md:row-start-3 md:text-right">
        {perContactA !== null && <span className="mono">{amps(perContactA)}</span>}{" "}
        <span className="text-ink-soft">
          in each of <span className="mono text-xs">{contacts}</span>
        </span>
      </span>
      <span className="text-sm max-md:col-start-2 max-md:row-start-1">
        <VerdictWord standing={fits ? "good" : "bad"}>{WORDS[verdict]}</VerdictWord>
      </span>
    </li>
  );
}
