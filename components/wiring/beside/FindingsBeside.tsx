"use client";

import clsx from "clsx";
import Link from "next/link";
import type { PinAt } from "@/lib/calc/interconnect";
import { FindingLine, type AcceptOf } from "./FindingLine";
import { openOf, splitByConnector, type ShownFinding } from "./shown-findings";

type Props = {
  project: string;
  findings: readonly ShownFinding[];
  /** The connector that is shown; none while all are. */
  connector: { id: string; name: string } | undefined;
  at: { connectorId: string; pin: string } | undefined;
  canEdit: boolean;
  hasSeveral: (board: string) => boolean;
  acceptOf: AcceptOf;
  onJump: (pin: PinAt) => void;
  onDo: (finding: ShownFinding) => void;
  className?: string;
};

/** More than anybody reads beside a table. */
const MOST = 40;

/** What the check found, as one types; the shown connector's first. */
export function FindingsBeside({ project, findings, connector, at, className, ...acts }: Props) {
  const ordered = [...openOf(findings), ...findings.filter(({ accepted }) => accepted !== null)];
  const { here, elsewhere } = splitByConnector(ordered, connector?.id);
  const others = elsewhere.slice(0, Math.max(0, MOST - here.length));
  const left = ordered.length - Math.min(here.length, MOST) - others.length;
  const line = (finding: ShownFinding) => (
    <FindingLine
      key={finding.key}
      project={project}
      finding={finding}
      isAtPin={finding.pins.some((pin) => pin.connectorId === at?.connectorId && pin.pin === at.pin)}
      {...acts}
    />
  );
  const heading = "px-4 pb-1 pt-3 text-xs font-semibold text-ink-soft sm:px-5";
  return (
    <section
      aria-labelledby="findings-beside"
      className={clsx("flex min-h-0 flex-col rounded-lg border border-rule bg-sheet", className)}
    >
      <header className="flex items-baseline justify-between gap-3 border-b border-rule px-4 py-3 sm:px-5">
        <h2 id="findings-beside" className="text-lg">
          Findings
        </h2>
        <Link href={`/projects/${project}/wiring/findings`} className="link text-sm text-ink-soft">
          All of them
        </Link>
      </header>
      <div className="relative min-h-0 flex-1 overflow-y-auto overscroll-contain">
        {ordered.length === 0 && (
          <p className="px-4 py-4 text-sm text-ink-soft sm:px-5">
            Nothing is found. The check looks at drivers, levels, loading, pull-ups, supplies and names with every key
            you type.
          </p>
        )}
        {connector && here.length > 0 && <p className={heading}>On {connector.name}</p>}
        {here.length > 0 && <ul className="divide-y divide-rule">{here.slice(0, MOST).map(line)}</ul>}
        {others.length > 0 && (
          <>
            <p className={clsx(heading, here.length > 0 && "border-t border-rule")}>
              {here.length > 0 ? "Elsewhere in the machine" : "In the machine; nothing on this connector"}
            </p>
            <ul className="divide-y divide-rule">{others.map(line)}</ul>
          </>
        )}
        {left > 0 && (
          <p className="border-t border-rule px-4 py-3 text-sm text-ink-soft sm:px-5">
            And {left} more. Mend these first; many of the others often go with them.
          </p>
        )}
      </div>
    </section>
  );
}
