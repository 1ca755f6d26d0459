import type { WorkedOut } from "@/lib/delay-path/work-out";
import { formatQuantity } from "@/lib/calc/units";

type Good = Extract<WorkedOut, { ok: true }>;

/** The chain part by part: figures of one piece, and what is assumed. */
export function DelaySteps({ worked: { given, delay } }: { worked: Good }) {
  return (
    <div
      className="relative overflow-x-auto"
      role="group"
      aria-label="Steps of the path, scrolls sideways"
      tabIndex={0}
    >
      <table aria-label="Steps of the path" className="w-full border-collapse text-left text-[0.9375rem]">
        <thead>
          <tr className="text-sm text-ink-soft">
            <th className="py-1.5 pr-4 text-right font-semibold">Count</th>
            <th className="py-1.5 pr-4 font-semibold">Passes</th>
            <th className="py-1.5 pr-4 text-right font-semibold">Lowest</th>
            <th className="py-1.5 pr-4 text-right font-semibold">Typical</th>
            <th className="py-1.5 text-right font-semibold">Highest</th>
          </tr>
        </thead>
        <tbody>
          {delay.steps.map((step, index) => (
            <tr key={index} className="border-t border-rule">
              <td className="mono py-1.5 pr-4 text-right text-sm">{step.count}</td>
              <th scope="row" className="mono py-1.5 pr-4 text-sm">
                {step.name}
              </th>
              <Figure of={step.minS} count={step.count} isAssumed={step.minAssumed} />
              <Figure of={step.typicalS} count={step.count} isAssumed={given[index]?.typicalS === null} />
              <Figure of={step.maxS} count={step.count} isAssumed={step.maxAssumed} />
            </tr>
          ))}
        </tbody>
      </table>
    </div>
  );
}

const Figure = ({ of, count, isAssumed }: { of: number | null; count: number; isAssumed: boolean }) => (
  <td className="mono whitespace-nowrap py-1.5 pr-4 text-right text-sm last:pr-0">
    {of === null ? (
      "–"
    ) : (
      <>
        {isAssumed && (
          <>
            <span aria-hidden="true" className="text-ink-soft">
              ≈{" "}
            </span>
            <span className="sr-only">assumed </span>
          </>
        )}
        {formatQuantity({ value: Number((of / count).toPrecision(3)), unit: "s" })}
      </>
    )}
  </td>
);
