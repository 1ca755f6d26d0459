import Link from "next/link";
import { Badge } from "@/components/ui/Badge";
import { Button } from "@/components/ui/Button";
import type { TableColumn } from "@/components/ui/table-column";
import { counted } from "@/components/workshop/counted";
import type { SignalLine } from "@/lib/signal/load-signals";
import { netAddress } from "../pin-address";
import { RemoveSignalButton } from "./RemoveSignalButton";
import type { RemoveSignal, SaveSignal } from "./signal-acts";
import { SignalDialog } from "./SignalDialog";

type Given = { project: string; acts: { save: SaveSignal; remove: RemoveSignal } | undefined };

export function signalColumns(given: Given): TableColumn<SignalLine>[] {
  return [
    {
      id: "name",
      header: "Signal",
      mono: true,
      isRowHeader: true,
      sortBy: ({ name }) => name,
      searchIn: ({ name, aliases, note }) => [name, ...aliases, note].join(" "),
      cell: (signal) => <SignalName signal={signal} project={given.project} />,
    },
    {
      id: "class",
      header: "Class",
      sortBy: (signal) => signal.class,
      cell: (signal) => <SignalClassWord signal={signal} />,
    },
    {
      id: "aliases",
      header: "Other names",
      mono: true,
      cell: ({ aliases }) => aliases.join(", "),
    },
    {
      id: "frequency",
      header: "Changes",
      mono: true,
      align: "end",
      className: "whitespace-nowrap",
      sortBy: ({ frequencyHz }) => frequencyHz,
      cell: ({ frequency }) => frequency,
    },
    { id: "pins", header: "Pins", mono: true, align: "end", sortBy: ({ pins }) => pins, cell: ({ pins }) => pins },
    {
      id: "boards",
      header: "On boards",
      mono: true,
      className: "max-w-56",
      sortBy: ({ boards }) => boards.length,
      searchIn: ({ boards }) => boards.join(" "),
      cell: ({ boards }) => boards.join(" "),
    },
    { id: "note", header: "Note", className: "text-ink-soft", cell: ({ note }) => note },
    ...(given.acts
      ? [
          {
            id: "acts",
            header: "Change",
            isHeaderHidden: true,
            align: "end" as const,
            className: "whitespace-nowrap",
            cell: (signal: SignalLine) => <SignalActs signal={signal} {...given} />,
          },
        ]
      : []),
  ];
}

function SignalName({ signal: { name, twins, pins }, project }: { signal: SignalLine; project: string }) {
  return (
    <span className="flex flex-col gap-0.5">
      {pins > 0 ? (
        <Link href={netAddress(project, name)} className="link">
          {name}
        </Link>
      ) : (
        <span>{name}</span>
      )}
      {twins.length > 0 && (
        <span className="font-text text-xs font-semibold text-failed">
          {twins.join(", ")} {twins.length === 1 ? "differs" : "differ"} only in case
        </span>
      )}
      {pins === 0 && <span className="font-text text-xs font-normal text-ink-soft">on no pin</span>}
    </span>
  );
}

const SignalClassWord = ({ signal }: { signal: SignalLine }) =>
  signal.class === "clock" ? (
    <Badge tone="copper">clock</Badge>
  ) : (
    <span className={signal.version === 0 ? "text-ink-faint" : ""}>{signal.class}</span>
  );

function SignalActs({ signal, project, acts }: { signal: SignalLine } & Given) {
  if (!acts) return null;
  return (
    <span className="inline-flex gap-1">
      <SignalDialog
        signal={signal}
        project={project}
        save={acts.save}
        trigger={
          <Button size="sm" kind="quiet" aria-label={`Change ${signal.name}`}>
            {signal.version === 0 ? "Say more" : "Change"}
          </Button>
        }
      />
      {signal.version > 0 && <RemoveSignalButton signal={signal} project={project} remove={acts.remove} />}
    </span>
  );
}

/** One signal on a phone. */
export function SignalCard({ signal, ...given }: { signal: SignalLine } & Given) {
  const { aliases, frequency, note, pins, boards } = signal;
  return (
    <div className="flex flex-col gap-1 border-b border-rule pb-2.5">
      <p className="flex flex-wrap items-baseline gap-x-2.5">
        <span className="mono font-semibold">
          <SignalName signal={signal} project={given.project} />
        </span>
        <SignalClassWord signal={signal} />
        <span className="mono text-sm">{frequency}</span>
      </p>
      <p className="text-sm text-ink-soft">
        {counted(pins, "pin")}
        {boards.length > 0 && ` on ${boards.join(", ")}`}
        {aliases.length > 0 && `; also ${aliases.join(", ")}`}
        {note && `. ${note}`}
      </p>
      {given.acts && (
        <p className="-ml-2">
          <SignalActs signal={signal} {...given} />
        </p>
      )}
    </div>
  );
}
