import { Panel } from "@/components/ui/Panel";
import type { NetFacts } from "@/lib/calc/interconnect";
import { formatQuantity } from "@/lib/calc/units";
import { Basis } from "./Basis";
import { Figure } from "./Figure";

const seconds = (value: number) => formatQuantity({ value, unit: "s" }, { significant: 2 });

type Props = { facts: NetFacts; frequencyHz: number | null };

/** What the driver has to charge, and what that does to its edge. */
export function NetEdge({ facts: { capacitancePf, edge, drivers, window }, frequencyHz }: Props) {
  if (capacitancePf === null || drivers.length === 0) return null;
  const isSlow = edge !== null && frequencyHz !== null && edge.edgeS * frequencyHz > 0.1;
  return (
    <Panel title="Load and edge">
      <div className="grid grid-cols-2 gap-x-5 gap-y-3 sm:grid-cols-4">
        <Figure
          label="Capacitive load"
          value={formatQuantity({ value: capacitancePf * 1e-12, unit: "F" }, { significant: 2 })}
        />
        {edge && (
          <>
            <Figure label="Edge, 10–90 %" value={seconds(edge.edgeS)} />
            {edge.delayS !== null && <Figure label="Gate delay with it" value={seconds(edge.delayS)} />}
            <Figure
              label="Output taken as"
              value={formatQuantity({ value: edge.outputOhm, unit: "Ω" }, { significant: 2 })}
            />
          </>
        )}
      </div>
      {edge && (
        <p className="mt-3 max-w-prose text-[0.9375rem]">
          {edge.sentence}
          {isSlow && " At the frequency that is stated, the edges take more than a tenth of each period."}
        </p>
      )}
      {!edge && window && (
        <p className="mt-3 max-w-prose text-[0.9375rem]">
          Its outputs only pull low: the resistor makes the rise, see below.
        </p>
      )}
      <Basis
        follows="typical figures of the families and one resistor for the output; common practice, no source."
        leavesOut="the spread of parts (twice is usual), supply and temperature, and lines so long that they ring."
      />
    </Panel>
  );
}
