import { formatQuantity, isUnit } from "@/lib/calc/units";
import type { StatedRange } from "./worked-example";

export function RangeTable({ name, ranges }: { name: string; ranges: readonly StatedRange[] }) {
  return (
    // Scrolled by keys as well where the screen is narrow.
    <div className="overflow-x-auto" role="group" aria-label={`Ranges of ${name}`} tabIndex={0}>
      <table aria-label={`Ranges of ${name}`} className="w-full border-collapse text-left text-[0.9375rem]">
        <thead>
          <tr className="text-sm text-ink-soft">
            <th className="py-1.5 pr-4 font-semibold">Up to</th>
            <th className="py-1.5 pr-4 font-semibold">Resolution</th>
            <th className="py-1.5 font-semibold">Accuracy</th>
          </tr>
        </thead>
        <tbody>
          {ranges.map((range, index) => (
            <tr key={index} className="border-t border-rule">
              <td className="mono whitespace-nowrap py-1.5 pr-4 text-sm">{write(range.fullScale, range.unit)}</td>
              <td className="mono whitespace-nowrap py-1.5 pr-4 text-sm">{write(range.resolution, range.unit)}</td>
              <td className="mono whitespace-nowrap py-1.5 text-sm">{accuracyOf(range)}</td>
            </tr>
          ))}
        </tbody>
      </table>
    </div>
  );
}

const write = (value: number, unit: string) => (isUnit(unit) ? formatQuantity({ value, unit }) : `${value} ${unit}`);

function accuracyOf({ percentOfReading, counts, percentOfRange }: StatedRange): string {
  const parts = [
    percentOfReading > 0 ? `${percentOfReading} %` : "",
    counts > 0 ? `${counts} ${counts === 1 ? "count" : "counts"}` : "",
    percentOfRange > 0 ? `${percentOfRange} % of range` : "",
  ].filter(Boolean);
  return parts.length === 1 ? `± ${parts[0]}` : `± (${parts.join(" + ")})`;
}
