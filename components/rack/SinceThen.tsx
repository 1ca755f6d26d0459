import { DateTime } from "@/components/ui/DateTime";
import { Panel } from "@/components/ui/Panel";
import type { SinceView } from "@/lib/rack/rack-view";

const counted = (count: number, one: string, many: string) => `${count} ${count === 1 ? one : many}`;

function sentence(parts: readonly (string | false)[]): string {
  const said = parts.filter((part) => part !== false);
  return said.length === 0 ? "" : `${said.join(", ")}.`;
}

export function SinceThen({ since, zone }: { since: SinceView; zone: string }) {
  const rest = sentence([
    since.firstPasses > 0 && `${since.firstPasses} passed at the first attempt`,
    since.repeats > 0 && `${since.repeats} repeated`,
    since.failures > 0 && `${since.failures} did not conform`,
  ]);
  const evidence = sentence([
    since.photos > 0 && counted(since.photos, "photo", "photos"),
    since.captures > 0 && counted(since.captures, "capture", "captures"),
  ]);
  return (
    <Panel title={since.from === "digest" ? "Since your last digest" : "Since Sunday"}>
      {since.attempts === 0 && evidence === "" ? (
        <p className="text-[0.9375rem] text-ink-soft">Nothing was recorded.</p>
      ) : (
        <p className="text-[0.9375rem] text-ink-soft">
          <strong className="font-semibold text-ink">{counted(since.attempts, "attempt", "attempts")}</strong>
          {since.evenings > 0 && ` on ${counted(since.evenings, "day", "days")}`}
          {rest === "" ? "." : `, ${rest}`} {evidence}
        </p>
      )}
      <p className="mt-1 text-sm text-ink-faint">
        From <DateTime at={since.at} zone={zone} />
      </p>
    </Panel>
  );
}
