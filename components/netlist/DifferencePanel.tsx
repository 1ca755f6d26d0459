import type { ReactNode } from "react";
import { Panel } from "@/components/ui/Panel";
import type { NetlistVersion, ShownDifference } from "@/lib/netlist/load-netlists";

type Props = { difference: ShownDifference; versions: readonly NetlistVersion[] };

/** What changed from one version to another: nets first, then pins. */
export function DifferencePanel({ difference, versions }: Props) {
  const name = (id: string) => {
    const version = versions.find((one) => one.id === id);
    return version ? `rev ${version.letter}, netlist ${version.number}` : "";
  };
  const { gained, lost, renamed, moved, pinsGained, pinsLost } = difference;
  const total = [gained, lost, renamed, moved, pinsGained, pinsLost].reduce((sum, { count }) => sum + count, 0);
  return (
    <Panel title="What changed" note={`from ${name(difference.before)} to ${name(difference.after)}`}>
      {total === 0 ? (
        <p>The two say the same: no net and no pin differs.</p>
      ) : (
        <div className="grid gap-x-8 gap-y-5 sm:grid-cols-2 lg:grid-cols-3">
          <Part title="Nets gained" part={gained} show={(net) => net} />
          <Part title="Nets lost" part={lost} show={(net) => net} />
          <Part title="Nets renamed" part={renamed} show={({ from, to }) => `${from} → ${to}`} />
          <Part
            title="Pins moved"
            part={moved}
            show={({ pin, from, to }) => `${pin}: ${from ?? "no net"} → ${to ?? "no net"}`}
          />
          <Part title="Pins gained" part={pinsGained} show={({ pin, net }) => `${pin} in ${net ?? "no net"}`} />
          <Part title="Pins lost" part={pinsLost} show={({ pin, net }) => `${pin} of ${net ?? "no net"}`} />
        </div>
      )}
    </Panel>
  );
}

type PartProps<Item> = {
  title: string;
  part: { count: number; shown: readonly Item[] };
  show: (item: Item) => ReactNode;
};

function Part<Item>({ title, part: { count, shown }, show }: PartProps<Item>) {
  if (count === 0) return null;
  return (
    <section className="min-w-0">
      <h3 className="text-base">
        {title} <span className="mono text-sm font-normal text-ink-soft">{count}</span>
      </h3>
      <ul tabIndex={0} aria-label={title} className="mono mt-1 max-h-64 overflow-y-auto text-sm leading-6">
        {shown.map((item, at) => (
          <li key={at} className="truncate">
            {show(item)}
          </li>
        ))}
        {count > shown.length && <li className="text-ink-soft">and {count - shown.length} more</li>}
      </ul>
    </section>
  );
}
