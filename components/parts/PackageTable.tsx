import type { Packing } from "@/lib/calc/packing";
import { formatQuantity } from "@/lib/calc/units";

/** What is counted, kind by kind, and the capacitors that go with it. */
export function PackageTable({ packing }: { packing: Packing }) {
  const { packageCapacitors, packageFarad, bulkCapacitors, bulkFarad, rule } = packing.decoupling;
  const apart = packing.mode === "per-block";
  return (
    <div className="flex flex-col gap-2.5">
      <div className="overflow-x-auto" role="group" aria-label="Packages by kind, scrolls sideways" tabIndex={0}>
        <table aria-label="Packages by kind" className="w-full border-collapse text-left text-[0.9375rem]">
          <thead>
            <tr className="text-sm text-ink-soft">
              <th className="py-1.5 pr-4 text-right font-semibold">Count</th>
              <th className="py-1.5 pr-4 font-semibold">Package</th>
              <th className="py-1.5 pr-4 font-semibold max-sm:hidden">What it is</th>
              {apart && <th className="py-1.5 pr-4 font-semibold max-sm:hidden">For</th>}
              <th className="py-1.5 pr-4 text-right font-semibold">Gates used</th>
              <th className="py-1.5 text-right font-semibold">Spare</th>
            </tr>
          </thead>
          <tbody>
            {packing.lines.map((line) => (
              <tr key={`${line.forBlock} ${line.part} ${line.gateFunction}`} className="border-t border-rule">
                <td className="mono py-1.5 pr-4 text-right text-sm">{line.count}</td>
                <th scope="row" className="mono whitespace-nowrap py-1.5 pr-4 text-sm">
                  {line.part}
                  <span className="block whitespace-normal font-text font-normal sm:hidden">
                    {line.partName}
                    {apart && <span className="block text-sm text-ink-soft">for {line.forBlock ?? "the board"}</span>}
                  </span>
                </th>
                <td className="py-1.5 pr-4 max-sm:hidden">{line.partName}</td>
                {apart && (
                  <td className="py-1.5 pr-4 text-sm text-ink-soft max-sm:hidden">{line.forBlock ?? "the board"}</td>
                )}
                <td className="mono whitespace-nowrap py-1.5 pr-4 text-right text-sm">
                  {line.gatesUsed} of {line.count * line.gatesPerPackage}
                </td>
                <td className="mono py-1.5 text-right text-sm">{line.spareGates || "–"}</td>
              </tr>
            ))}
            {packageCapacitors > 0 && (
              <tr className="border-t border-rule">
                <td className="mono py-1.5 pr-4 text-right text-sm">{packageCapacitors}</td>
                <th scope="row" className="mono whitespace-nowrap py-1.5 pr-4 text-sm">
                  {formatQuantity({ value: packageFarad, unit: "F" })}
                </th>
                <td colSpan={4} className="py-1.5">
                  decoupling, at the supply pins of each package
                </td>
              </tr>
            )}
            {bulkCapacitors > 0 && (
              <tr className="border-t border-rule">
                <td className="mono py-1.5 pr-4 text-right text-sm">{bulkCapacitors}</td>
                <th scope="row" className="mono whitespace-nowrap py-1.5 pr-4 text-sm">
                  {formatQuantity({ value: bulkFarad, unit: "F" })}
                </th>
                <td colSpan={4} className="py-1.5">
                  bulk, on the rail
                </td>
              </tr>
            )}
          </tbody>
        </table>
      </div>
      <p className="text-sm text-ink-soft">Capacitors: {rule}</p>
      {packing.notes.map((note) => (
        <p key={note} className="text-sm text-ink-soft">
          {note}
        </p>
      ))}
    </div>
  );
}
