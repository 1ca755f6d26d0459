"use client";

import { Badge } from "@/components/ui/Badge";
import { Button } from "@/components/ui/Button";
import { Icon } from "@/components/ui/Icon";
import { IconButton } from "@/components/ui/IconButton";
import { Panel } from "@/components/ui/Panel";
import type { Machine, NetFacts } from "@/lib/calc/interconnect";
import type { SignalLine } from "@/lib/signal/load-signals";
import { SignalDialog } from "../signals/SignalDialog";
import type { SaveSignal } from "../signals/signal-acts";
import type { NetLine } from "./net-lines";
import { NetEdge } from "./NetEdge";
import { NetFindings } from "./NetFindings";
import { NetLevels } from "./NetLevels";
import { NetLoading } from "./NetLoading";
import { NetParties } from "./NetParties";
import { NetPullUp } from "./NetPullUp";
import { NetTouches } from "./NetTouches";

type Props = {
  line: NetLine;
  facts: NetFacts;
  machine: Machine;
  signal: SignalLine | undefined;
  project: string;
  canEdit: boolean;
  save: SaveSignal;
  onClose: () => void;
};

/** One net with all that is known and reckoned of it: who drives it, what it bears, where it goes. */
export function NetPanel({ line, facts, machine, signal, project, canEdit, save, onClose }: Props) {
  const { net, findings } = line;
  const isSupply = line.class === "power" || line.class === "ground";
  return (
    <div className="flex min-w-0 flex-col gap-4">
      <button
        type="button"
        onClick={onClose}
        className="inline-flex min-h-11 items-center gap-1.5 self-start rounded font-semibold text-copper lg:hidden"
      >
        <Icon name="chevron-left" /> All nets
      </button>
      <Panel>
        <header className="flex items-start justify-between gap-3">
          <div className="min-w-0">
            <h2 className="mono break-words text-xl font-semibold">{net.name === "" ? net.id : net.name}</h2>
            <p className="mt-1.5 flex flex-wrap items-center gap-x-2.5 gap-y-1 text-sm text-ink-soft">
              <Badge tone={line.class === "clock" ? "copper" : "plain"}>{line.class}</Badge>
              {signal?.frequency && <span className="mono">{signal.frequency}</span>}
              <NamesOf line={line} signal={signal} />
            </p>
            {signal?.note && <p className="mt-1.5 text-sm text-ink-soft">{signal.note}</p>}
          </div>
          <div className="flex shrink-0 gap-1">
            {canEdit && signal && (
              <SignalDialog
                signal={signal}
                project={project}
                save={save}
                trigger={<Button size="sm">Edit the signal</Button>}
              />
            )}
            <span className="max-lg:hidden">
              <IconButton icon="close" label="Close this net" tooltip={false} onPress={onClose} />
            </span>
          </div>
        </header>
        <p className="mt-3 max-w-prose text-[0.9375rem]">{facts.sentences[0] ?? whatItIs(line)}</p>
        {facts.unknownFamilies.length > 0 && !isSupply && (
          <p className="mt-1 max-w-prose text-sm text-doubtful">{unknownFamilies(facts.unknownFamilies)}</p>
        )}
      </Panel>
      <NetFindings findings={findings} project={project} />
      {!isSupply && (
        <>
          <NetParties facts={facts} />
          <NetLevels facts={facts} machine={machine} />
          <NetLoading facts={facts} />
          <NetEdge facts={facts} frequencyHz={signal?.frequencyHz ?? null} />
          <NetPullUp facts={facts} frequencyHz={signal?.frequencyHz ?? null} />
        </>
      )}
      <NetTouches net={net} project={project} />
    </div>
  );
}

function NamesOf({ line: { net }, signal }: { line: NetLine; signal: SignalLine | undefined }) {
  const others = net.names.filter((name) => name !== net.name);
  const agreed = (signal?.aliases ?? []).filter((name) => !others.includes(name));
  const said = [...others, ...agreed];
  return said.length === 0 ? null : (
    <span>
      also <span className="mono">{said.join(", ")}</span>
    </span>
  );
}

const whatItIs = ({ class: kind, net }: NetLine) => {
  const pins = `${net.pins.length} ${net.pins.length === 1 ? "pin" : "pins"}`;
  if (kind === "ground") return `The return of everything, on ${pins}.`;
  return kind === "power" ? `A supply, on ${pins}.` : `Copper only, on ${pins}: nothing drives it and nothing listens.`;
};

function unknownFamilies(families: readonly string[]): string {
  const named = families.filter((family) => family !== "");
  if (named.length === 0) return "Some of its pins name no family; those are not looked at below.";
  return `Not looked at below: ${named.join(", ")}, which the table of families does not have.`;
}
