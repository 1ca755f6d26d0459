"use client";

import { parseAsString, parseAsStringLiteral, useQueryStates } from "nuqs";
import type { z } from "zod";
import { Page } from "@/components/shell/Page";
import { EmptyState } from "@/components/ui/EmptyState";
import type { Reply } from "@/components/ui/form/reply";
import { Panel } from "@/components/ui/Panel";
import { Select } from "@/components/ui/Select";
import type { FindingView } from "@/lib/finding/load-findings";
import type { acceptFindingInput, withdrawAcceptanceInput } from "@/lib/finding/schema";
import { WEIGHT_WORDS } from "../WeightMark";
import { AcceptFinding, WithdrawAcceptance } from "./DecideFinding";
import { boardsOf, findingsSentence, groupFindings, STATES } from "./finding-groups";
import { FindingEntry } from "./FindingEntry";
import { WhatIsChecked } from "./WhatIsChecked";

type Act<Schema extends z.ZodType> = (input: z.input<Schema>) => Promise<Reply<{ title: string }>>;

type Props = {
  findings: readonly FindingView[];
  /** Connectors with at least one pin: without any there is nothing to check. */
  hasPins: boolean;
  project: string;
  zone: string;
  canAccept: boolean;
  accept: Act<typeof acceptFindingInput>;
  withdraw: Act<typeof withdrawAcceptanceInput>;
};

const ANY = "any";
const STATE_OPTIONS = [
  { id: "all", label: "Open and accepted" },
  { id: "open", label: "Open" },
  { id: "accepted", label: "Accepted" },
];

/** Everything that the rule check says about the assembled machine, the weightiest first. */
export function FindingsPlace({ findings, hasPins, project, zone, canAccept, accept, withdraw }: Props) {
  const [filter, setFilter] = useQueryStates({
    board: parseAsString,
    state: parseAsStringLiteral(STATES).withDefault("all"),
  });
  const { groups, accepted } = groupFindings(findings, filter);
  const shown = groups.reduce((count, group) => count + group.findings.length, accepted.length);
  const entry = (finding: FindingView) => (
    <FindingEntry
      key={finding.key}
      finding={finding}
      project={project}
      zone={zone}
      actions={
        canAccept &&
        (finding.accepted ? (
          <WithdrawAcceptance finding={finding} project={project} withdraw={withdraw} />
        ) : (
          <AcceptFinding finding={finding} project={project} accept={accept} />
        ))
      }
    />
  );
  return (
    <Page
      title="Findings"
      lede={hasPins ? findingsSentence(findings) : "Nothing is wired yet."}
      aside={<WhatIsChecked />}
    >
      {findings.length > 0 && (
        <div className="flex flex-wrap gap-3">
          <Select
            label="Board"
            isLabelHidden
            className="min-w-36 flex-1 sm:max-w-44"
            options={[{ id: ANY, label: "Every board" }, ...boardsOf(findings).map((id) => ({ id, label: id }))]}
            value={filter.board ?? ANY}
            onChange={(id) => void setFilter({ board: id === ANY ? null : id })}
          />
          <Select
            label="State"
            isLabelHidden
            className="min-w-36 flex-1 sm:max-w-52"
            options={STATE_OPTIONS}
            value={filter.state}
            onChange={(id) => void setFilter({ state: STATES.find((state) => state === id) ?? "all" })}
          />
        </div>
      )}
      {groups.map((group) => (
        <Panel key={group.weight} title={WEIGHT_WORDS[group.weight]} note={group.findings.length} padding="none">
          <div className="border-t border-rule">{group.findings.map(entry)}</div>
        </Panel>
      ))}
      {accepted.length > 0 && (
        <Panel title="Accepted" note={accepted.length} padding="none">
          <div className="border-t border-rule">{accepted.map(entry)}</div>
        </Panel>
      )}
      {shown === 0 && <NothingFound hasPins={hasPins} isFiltered={findings.length > 0} />}
    </Page>
  );
}

function NothingFound({ hasPins, isFiltered }: { hasPins: boolean; isFiltered: boolean }) {
  if (isFiltered) return <EmptyState title="Nothing here">No finding fits what you chose above.</EmptyState>;
  if (hasPins) {
    return (
      <EmptyState title="Nothing found">
        The rules beside this found nothing to say about the wiring as it is kept. That is a plan without a known
        mistake, not a proof: what the rules leave out stays to be looked at.
      </EmptyState>
    );
  }
  return (
    <EmptyState title="No findings yet">
      Give the boards their connectors and say what each pin carries. The whole machine is then checked with every
      change, and what must be mended is listed here.
    </EmptyState>
  );
}
