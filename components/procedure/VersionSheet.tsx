import { Notice } from "@/components/ui/Notice";
import { Panel } from "@/components/ui/Panel";
import type { CheckRow } from "@/lib/procedure/check-row";
import { STAGES } from "@/lib/procedure/stages";
import { CheckFacts } from "./CheckFacts";

/** A version to read: by stage, each check with its whole text behind its line. */
export function VersionSheet({ checks }: { checks: readonly CheckRow[] }) {
  const titleOf = (key: string) => checks.find((check) => check.key === key)?.title;
  return (
    <div className="flex flex-col gap-4">
      {STAGES.map((stage) => {
        const rows = checks.filter((check) => check.stage === stage.id);
        if (rows.length === 0) return null;
        return (
          <Panel key={stage.id} title={stage.name} note={rows.length === 1 ? "1 check" : `${rows.length} checks`}>
            <ul className="flex flex-col">
              {rows.map((check) => (
                <li key={check.key} className="border-b border-rule last:border-b-0">
                  <details>
                    <summary className="list-none rounded py-2 hover:text-copper [&::-webkit-details-marker]:hidden">
                      <CheckFacts check={check} number={checks.indexOf(check) + 1} />
                    </summary>
                    <div className="flex flex-col gap-3 pb-3 pl-9 text-[0.9375rem]">
                      {check.instruction && <p className="max-w-prose whitespace-pre-line">{check.instruction}</p>}
                      {check.caution && (
                        <Notice kind="caution">
                          <p className="whitespace-pre-line">{check.caution}</p>
                        </Notice>
                      )}
                      <CheckDetail check={check} titleOf={titleOf} />
                    </div>
                  </details>
                </li>
              ))}
            </ul>
          </Panel>
        );
      })}
    </div>
  );
}

function CheckDetail({ check, titleOf }: { check: CheckRow; titleOf: (key: string) => string | undefined }) {
  const { covers } = check;
  const rows = [
    ["Reference", check.reference],
    ["Signals", covers.signals.join(", ")],
    ["Pins", covers.pins.join(", ")],
    ["Rails", covers.rails.join(", ")],
    ["Blocks", covers.blocks.join(", ")],
    ["Needs", check.needs.flatMap((key) => titleOf(key) ?? []).join(" · ")],
  ].filter(([, value]) => value !== "");
  if (rows.length === 0) return null;
  return (
    <dl className="grid grid-cols-[auto_minmax(0,1fr)] gap-x-4 gap-y-1 text-sm">
      {rows.map(([name, value]) => (
        <div key={name} className="contents">
          <dt className="text-ink-soft">{name}</dt>
          <dd>{value}</dd>
        </div>
      ))}
    </dl>
  );
}
