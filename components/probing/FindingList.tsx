import { BoardDrawing } from "./BoardDrawing";
import { Badge } from "@/components/ui/Badge";
import { ButtonLink } from "@/components/ui/ButtonLink";
import type { ContinuityFinding } from "@/lib/calc/continuity";
import type { RoundView } from "@/lib/probing/round-view";
import { faultAddress } from "./fault-address";

type Props = {
  findings: readonly ContinuityFinding[];
  round: RoundView;
  project: string;
  mayFault: boolean;
};

const TONES = {
  open: "failed",
  short: "failed",
  crossed: "failed",
  "high resistance": "doubtful",
  leak: "doubtful",
} as const;

/** What the answers come to, the worst first; each can become a fault. */
export function FindingList({ findings, round, project, mayFault }: Props) {
  return (
    <ul className="flex flex-col">
      {findings.map((finding, at) => (
        <li
          key={at}
          className="grid items-start gap-x-6 gap-y-3 border-b border-rule py-4 first:pt-0 last:border-b-0 last:pb-0 md:grid-cols-[minmax(0,1fr)_15rem]"
        >
          <div className="min-w-0">
            <h3 className="flex flex-wrap items-center gap-x-2.5 gap-y-1 text-base">
              <Badge tone={TONES[finding.kind]}>{finding.kind}</Badge>
              <span className="mono">{finding.nets.join(" / ")}</span>
            </h3>
            <p className="mt-1.5 max-w-prose">{finding.sentence}</p>
            {finding.lookAt !== "" && (
              <p className="mt-1 max-w-prose text-[0.9375rem] text-ink-soft">{finding.lookAt}</p>
            )}
            {finding.mendFirst !== "" && (
              <p className="mt-1 max-w-prose text-[0.9375rem] font-medium text-doubtful">{finding.mendFirst}</p>
            )}
            <p className="mono mt-2 flex flex-wrap gap-x-3 text-sm">
              {finding.pins.slice(0, 12).map((pin) => (
                <span key={pin}>{pin}</span>
              ))}
              {finding.pins.length > 12 && <span className="text-ink-soft">and {finding.pins.length - 12} more</span>}
            </p>
            {mayFault && (
              <ButtonLink
                size="sm"
                className="mt-3"
                href={faultAddress(project, round.unit.serial, round.id, finding)}
                prefetch={false}
              >
                Make a fault
              </ButtonLink>
            )}
          </div>
          <Where finding={finding} round={round} />
        </li>
      ))}
    </ul>
  );
}

/** The first two of its pins on the board. */
function Where({ finding: { pins }, round: { points, drawing } }: { finding: ContinuityFinding; round: RoundView }) {
  const lit = pins.flatMap((pin) => points.find(({ name }) => name === pin) ?? []).slice(0, 2);
  const [a, b] = lit;
  if (!a || a.xMm === null) return null;
  return (
    <BoardDrawing
      points={points}
      outline={drawing.outline}
      lit={[{ ...a, mark: "a" }, ...(b ? [{ ...b, mark: "b" as const }] : [])]}
      label="Where it is"
    />
  );
}
