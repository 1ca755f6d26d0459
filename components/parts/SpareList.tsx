import type { SpareGate } from "@/lib/calc/packing";

/** Spare gates package by package, each pin with what it wants. */
export function SpareList({ spares }: { spares: readonly SpareGate[] }) {
  const byPackage = new Map<string, SpareGate[]>();
  for (const spare of spares) byPackage.set(spare.designator, [...(byPackage.get(spare.designator) ?? []), spare]);
  return (
    <div className="overflow-x-auto" role="group" aria-label="Spare gates, scrolls sideways" tabIndex={0}>
      <table aria-label="Spare gates" className="w-full border-collapse text-left text-[0.9375rem]">
        <thead>
          <tr className="text-sm text-ink-soft">
            <th className="py-1.5 pr-4 font-semibold">Package</th>
            <th className="py-1.5 pr-4 font-semibold">Gate</th>
            <th className="py-1.5 pr-4 font-semibold">To ground</th>
            <th className="py-1.5 pr-4 font-semibold">To the rail</th>
            <th className="py-1.5 font-semibold">Stays open</th>
          </tr>
        </thead>
        <tbody>
          {[...byPackage].flatMap(([designator, own]) =>
            own.map((spare, index) => (
              <tr key={`${designator} ${spare.gate}`} className="border-t border-rule align-baseline">
                {index === 0 && (
                  <th scope="rowgroup" rowSpan={own.length} className="whitespace-nowrap py-1.5 pr-4 align-baseline">
                    <span className="mono text-sm">{designator}</span>{" "}
                    <span className="mono text-sm font-normal text-ink-soft">{spare.part}</span>
                  </th>
                )}
                <td className="mono py-1.5 pr-4 text-sm font-semibold">{spare.gate}</td>
                <Pins pins={spare.tieLow} none={isKnown(spare) ? "–" : `its ${spare.inputCount} inputs`} />
                <Pins pins={spare.tieHigh} none="–" />
                <Pins pins={spare.leaveOpen} none={isKnown(spare) ? "–" : "outputs"} />
              </tr>
            )),
          )}
        </tbody>
      </table>
    </div>
  );
}

const isKnown = ({ tieLow, tieHigh, leaveOpen }: SpareGate) => tieLow.length + tieHigh.length + leaveOpen.length > 0;

const Pins = ({ pins, none }: { pins: readonly number[]; none: string }) => (
  <td className="py-1.5 pr-4">
    {pins.length === 0 ? (
      <span className="text-ink-soft">{none}</span>
    ) : (
      <span className="mono text-sm">{pins.join(", ")}</span>
    )}
  </td>
);
