import { VerdictFigure } from "@/components/traveler/VerdictFigure";
import { formatLimits } from "@/lib/calc/units";
import type { RecordViewProps } from "../kind";
import { figure } from "../reading-limits";
import type { Entry, Spec } from "./schema";

/** The table as it was recorded; without a record, blank boxes under their limits, as on paper. */
export function RecordView({ spec, record, readings }: RecordViewProps<Spec, Entry>) {
  return (
    <div className="overflow-x-auto">
      <table className="border-rule-strong w-full border-collapse border text-sm">
        <thead>
          <tr>
            <td className="border-rule-strong border" />
            {spec.columns.map((column) => (
              <th key={column} scope="col" className="border-rule-strong border px-2 py-1 text-left font-semibold">
                {column}
              </th>
            ))}
          </tr>
        </thead>
        <tbody>
          {spec.rows.map((row, r) => (
            <tr key={row.label}>
              <th scope="row" className="border-rule-strong border px-2 py-1 text-left font-semibold">
                {row.label}
                <span className="text-ink-soft mono block text-xs font-normal">{formatLimits(row.limits.value)}</span>
              </th>
              {spec.columns.map((column, c) => {
                const reading = readings.find((one) => one.label === `${row.label}, ${column}`);
                const own = row.cells[c];
                return (
                  <td key={column} className="border-rule-strong h-9 border px-2 py-1 align-top">
                    {reading ? (
                      <VerdictFigure verdict={reading.verdict}>{figure(reading.value, reading.unit)}</VerdictFigure>
                    ) : (
                      <span className="mono">{record?.cells[r]?.[c] ?? ""}</span>
                    )}
                    {own && <span className="text-ink-soft mono block text-xs">{formatLimits(own.value)}</span>}
                  </td>
                );
              })}
            </tr>
          ))}
        </tbody>
      </table>
    </div>
  );
}
