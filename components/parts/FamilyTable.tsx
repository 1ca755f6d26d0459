import type { FamilyFigures, LogicPart } from "@/lib/calc/logic-parts";
import { formatQuantity, type Unit } from "@/lib/calc/units";

/** Figures by family; what nobody gives generically is a dash, and the data sheet has it. */
export function FamilyTable({ part }: { part: LogicPart }) {
  const rows = Object.entries(part.perFamily);
  if (rows.length === 0) {
    return (
      <p className="text-[0.9375rem] text-ink-soft">
        No generic figures by family. Take the data sheet’s, as a part of your own.
      </p>
    );
  }
  return (
    <div
      className="relative overflow-x-auto"
      role="group"
      aria-label="Figures by family, scrolls sideways"
      tabIndex={0}
    >
      <table className="w-full border-collapse text-left text-[0.9375rem]">
        <caption className="sr-only">Figures by family</caption>
        <thead>
          <tr className="text-sm text-ink-soft">
            <th className="py-1.5 pr-4 font-semibold">Family</th>
            <th className="py-1.5 pr-4 text-right font-semibold">At rest, at most</th>
            <th className="py-1.5 pr-4 text-right font-semibold">Cpd</th>
            <th className="py-1.5 pr-4 text-right font-semibold">Delay, typical</th>
            <th className="py-1.5 pr-4 text-right font-semibold">at most</th>
            <th className="py-1.5 font-semibold">From</th>
          </tr>
        </thead>
        <tbody>
          {rows.map(([family, figures]) => (
            <tr key={family} className="border-t border-rule align-baseline">
              <th scope="row" className="mono py-1.5 pr-4 text-sm">
                {family}
              </th>
              <Figure value={figures.staticA} unit="A" />
              <td className="mono whitespace-nowrap py-1.5 pr-4 text-right text-sm">{cpdText(figures)}</td>
              <Figure value={figures.tpdTypicalS} unit="s" />
              <Figure value={figures.tpdMaxS} unit="s" />
              <td className="min-w-48 py-1.5 text-sm text-ink-soft">{figures.note}</td>
            </tr>
          ))}
        </tbody>
      </table>
    </div>
  );
}

const Figure = ({ value, unit }: { value: number | null; unit: Unit }) => (
  <td className="mono whitespace-nowrap py-1.5 pr-4 text-right text-sm">
    {value === null ? "–" : formatQuantity({ value, unit })}
  </td>
);

const cpdText = ({ cpdPf, cpdPer }: FamilyFigures) =>
  cpdPf === null ? "–" : `${formatQuantity({ value: cpdPf / 1e12, unit: "F" })} a ${cpdPer}`;
