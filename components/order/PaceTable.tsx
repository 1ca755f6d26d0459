import Link from "next/link";
import { Panel } from "@/components/ui/Panel";
import type { PaceLine } from "@/lib/bench-session/sessions-view";
import { formatDuration } from "@/lib/calc/units";

const write = (seconds: number | null) => (seconds === null ? "–" : formatDuration(seconds));

/** How long a check takes, by stage: the median time from the attempt before, within a session. */
export function PaceTable({ lines, project }: { lines: readonly PaceLine[]; project: string }) {
  return (
    <Panel title="Pace">
      <table className="w-full text-[0.9375rem]">
        <thead>
          <tr className="text-left text-sm text-ink-soft">
            <th scope="col" className="pb-1 font-semibold">
              A check takes
            </th>
            <th scope="col" className="pb-1 text-right font-semibold">
              you
            </th>
            <th scope="col" className="pb-1 pl-3 text-right font-semibold">
              everybody
            </th>
          </tr>
        </thead>
        <tbody>
          {lines.map(({ stage, name, ownS, everybodyS }) => (
            <tr key={stage} className="border-t border-rule">
              <th scope="row" className="py-1 text-left font-normal">
                {name}
              </th>
              <td className="mono py-1 text-right text-sm">{write(ownS)}</td>
              <td className="mono py-1 pl-3 text-right text-sm text-ink-soft">{write(everybodyS)}</td>
            </tr>
          ))}
        </tbody>
      </table>
      <p className="mt-2 text-sm text-ink-soft">
        Medians from{" "}
        <Link className="link" href={`/projects/${project}/order/sessions`}>
          the sessions
        </Link>{" "}
        of half a year. Your own counts for the plan; where you have none, everybody’s.
      </p>
    </Panel>
  );
}
