import Link from "next/link";
import { Panel } from "@/components/ui/Panel";
import type { FindingView } from "@/lib/finding/load-findings";
import { WEIGHT_WORDS, WeightMark } from "../WeightMark";

/** What the rule check says of this net; decided on the page of findings. */
export function NetFindings({ findings, project }: { findings: readonly FindingView[]; project: string }) {
  if (findings.length === 0) return null;
  return (
    <Panel
      title="Findings"
      actions={
        <Link href={`/projects/${project}/wiring/findings`} className="link text-sm">
          All findings
        </Link>
      }
    >
      <ul className="flex flex-col gap-3">
        {findings.map(({ key, weight, title, why, mend, accepted }) => (
          <li key={key} className="flex gap-2.5 text-[0.9375rem]">
            <WeightMark weight={weight} className="mt-1" />
            <div className="min-w-0 max-w-prose">
              <p className="font-semibold">
                <span className="sr-only">{WEIGHT_WORDS[weight]}: </span>
                {title}
                {accepted && <span className="font-normal text-ink-soft"> (accepted)</span>}
              </p>
              <p className="text-ink-soft">{accepted ? `${accepted.by}: ${accepted.reason}` : why}</p>
              {!accepted && (
                <p>
                  <b className="font-semibold">Mend:</b> {mend}
                </p>
              )}
            </div>
          </li>
        ))}
      </ul>
    </Panel>
  );
}
