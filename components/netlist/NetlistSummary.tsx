import { BoardDrawing } from "@/components/probing/BoardDrawing";
import type { NetlistReading } from "@/lib/calc/netlist";

/** What was read of a file, in figures, with its header and a drawing where it has places. */
export function NetlistSummary({ reading: { netlist, read } }: { reading: NetlistReading }) {
  const points = netlist.nets.flatMap((net) => net.points);
  return (
    <div className="grid items-start gap-5 md:grid-cols-[minmax(0,1fr)_minmax(0,20rem)]">
      <div>
        <dl className="flex flex-wrap gap-x-7 gap-y-3">
          {read
            .filter(({ count }) => count > 0)
            .map(({ what, count }) => (
              <div key={what}>
                <dt className="text-sm text-ink-soft">{what}</dt>
                <dd className="mono text-xl font-semibold">{count.toLocaleString("en-GB")}</dd>
              </div>
            ))}
        </dl>
        {netlist.facts.length > 0 && (
          <dl className="mt-4 grid grid-cols-[auto_minmax(0,1fr)] gap-x-4 gap-y-0.5 text-sm">
            {netlist.facts.slice(0, 12).map(({ name, value }, at) => (
              <div key={at} className="contents">
                <dt className="text-ink-soft">{name}</dt>
                <dd className="mono truncate text-xs leading-5">{value}</dd>
              </div>
            ))}
          </dl>
        )}
      </div>
      <BoardDrawing
        points={points}
        outline={netlist.outlines.filter(({ kind }) => kind === "board").flatMap(({ paths }) => paths)}
        lit={[]}
        label="The points of the file where they lie"
      />
    </div>
  );
}
