import { Panel } from "@/components/ui/Panel";
import type { NetFacts } from "@/lib/calc/interconnect";
import { Basis } from "./Basis";
import { ShareBar } from "./ShareBar";

/** How much of what its output can bear the net takes, at both levels, for the driver that is worst off. */
export function NetLoading({ facts: { fanOut, drivers } }: { facts: NetFacts }) {
  if (!fanOut) return null;
  return (
    <Panel title="Fan-out" note={drivers.length > 1 ? `of ${fanOut.driver.place}, the worst off` : undefined}>
      <div className="grid gap-4 sm:grid-cols-2">
        <ShareBar label="At high" load={fanOut.high} />
        <ShareBar label="At low" load={fanOut.low} />
      </div>
      <p className="mt-3 max-w-prose text-[0.9375rem]">{fanOut.sentence}</p>
      <Basis
        follows="the definition of DC fan-out: the currents of all inputs, switched-off outputs and the pull-up against IOH and IOL of the data sheet."
        leavesOut="currents while switching; CMOS inputs slow an edge long before they load a level."
      />
    </Panel>
  );
}
