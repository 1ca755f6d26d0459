import clsx from "clsx";
import type { PathDelay } from "@/lib/calc/delay";
import { formatQuantity } from "@/lib/calc/units";

/** Four digits are more than a delay is known to. */
const ns = (seconds: number) => formatQuantity({ value: Number(seconds.toPrecision(4)), unit: "s" });

type Bar = { name: string; about: string; total: number | null; parts: (number | null)[]; isLimit: boolean };

/** The sums as lengths: each step a stretch of its row, so that one sees which part takes the time. */
export function DelayBars({ delay }: { delay: PathDelay }) {
  const { steps, minS, typicalS, worstCaseS, rootSumSquareS } = delay;
  const longest = worstCaseS ?? typicalS;
  const bars: Bar[] = [
    {
      name: "Lowest",
      about: "every part at its quickest",
      total: minS,
      parts: steps.map((step) => step.minS),
      isLimit: true,
    },
    {
      name: "Typical",
      about: "sum of typical delays",
      total: typicalS,
      parts: steps.map((step) => step.typicalS),
      isLimit: false,
    },
    {
      name: "Root-sum-square",
      about: "likely, no bound: parts vary each on its own",
      total: rootSumSquareS,
      parts: [rootSumSquareS],
      isLimit: false,
    },
    {
      name: "Worst case",
      about: "every part at its slowest at once",
      total: worstCaseS,
      parts: steps.map((step) => step.maxS),
      isLimit: true,
    },
  ];
  return (
    <dl className="grid gap-x-4 gap-y-2.5 sm:grid-cols-[11rem_minmax(0,1fr)_6rem]">
      {bars.map(({ name, about, total, parts, isLimit }) => (
        <div key={name} className="contents">
          <dt className="text-[0.9375rem] leading-tight max-sm:-mb-1.5">
            <span className={clsx(isLimit && "font-semibold")}>{name}</span>
            <span className="block text-xs text-ink-soft">{about}</span>
          </dt>
          <dd aria-hidden="true" className="flex items-center">
            {total === null ? (
              <span className="hatch h-3.5 w-full rounded-sm border border-rule" />
            ) : (
              parts.map((part, index) => (
                <span
                  key={index}
                  style={{ width: `${(100 * (part ?? 0)) / longest}%` }}
                  className={clsx(
                    "h-3.5 border-r border-sheet first:rounded-l-sm last:rounded-r-sm",
                    parts.length === 1 ? "bg-solder-light" : index % 2 === 0 ? "bg-copper" : "bg-solder",
                  )}
                />
              ))
            )}
          </dd>
          <dd className={clsx("mono self-center text-sm sm:text-right", isLimit && "font-semibold", "max-sm:-mt-1.5")}>
            {total === null ? <span className="font-text font-normal text-ink-soft">not known</span> : ns(total)}
          </dd>
        </div>
      ))}
    </dl>
  );
}
