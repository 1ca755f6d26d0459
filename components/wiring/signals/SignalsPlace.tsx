"use client";

import { Page } from "@/components/shell/Page";
import { Button } from "@/components/ui/Button";
import { EmptyState } from "@/components/ui/EmptyState";
import { Panel } from "@/components/ui/Panel";
import { Table } from "@/components/ui/Table";
import { counted } from "@/components/workshop/counted";
import type { SignalLine } from "@/lib/signal/load-signals";
import type { RemoveSignal, SaveSignal } from "./signal-acts";
import { SignalDialog } from "./SignalDialog";
import { SignalCard, signalColumns } from "./signal-columns";

type Props = {
  signals: readonly SignalLine[];
  project: string;
  canEdit: boolean;
  save: SaveSignal;
  remove: RemoveSignal;
};

/** Every signal of the machine with what is known of it beyond its pins. */
export function SignalsPlace({ signals, project, canEdit, save, remove }: Props) {
  const said = signals.filter(({ version }) => version > 0).length;
  const acts = canEdit ? { save, remove } : undefined;
  return (
    <Page
      title="Signals"
      lede={`${counted(signals.length, "signal")}; more is said of ${said}. One of which nothing is said counts as data, under one name.`}
      actions={
        canEdit && (
          <SignalDialog project={project} save={save} trigger={<Button kind="primary">Say more of a signal</Button>} />
        )
      }
    >
      {signals.length === 0 ? (
        <EmptyState title="No signals yet">
          Signals appear here as soon as a pin carries one. Then say which are clocks, what other boards call them, and
          how often they change: the rule check judges clocks, names and pull-ups with it.
        </EmptyState>
      ) : (
        <Panel>
          <Table<SignalLine>
            label="Signals"
            search="Find a signal"
            columns={signalColumns({ project, acts })}
            rows={signals}
            rowKey={({ name }) => name}
            pageSize={50}
            empty={null}
            phone={(signal) => <SignalCard signal={signal} project={project} acts={acts} />}
            isDense
          />
        </Panel>
      )}
    </Page>
  );
}
