import { Panel } from "@/components/ui/Panel";
import { counted } from "@/components/workshop/counted";
import type { GateLine } from "@/lib/block/gates-inside";

/** Gates by what they do, most of a kind first. */
export function GateTotals({ title, gates }: { title: string; gates: readonly GateLine[] }) {
  const sum = gates.reduce((total, { count }) => total + count, 0);
  return (
    <Panel title={title} note={sum > 0 ? counted(sum, "gate") : undefined}>
      {gates.length === 0 ? (
        <p className="text-sm text-ink-soft">No gates yet.</p>
      ) : (
        <dl className="grid grid-cols-[auto_minmax(0,1fr)] gap-x-3 gap-y-1 text-[0.9375rem]">
          {gates.map(({ gateFunction, name, count }) => (
            <div key={gateFunction} className="contents">
              <dt className="mono text-right text-sm leading-6">{count}</dt>
              <dd>{name}</dd>
            </div>
          ))}
        </dl>
      )}
    </Panel>
  );
}
