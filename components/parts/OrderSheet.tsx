import { writeDate } from "@/components/ui/DateTime";
import { money } from "@/lib/part/price";
import type { PartsListView } from "@/lib/parts-list/load-parts-list";

type Props = { projectName: string; zone: string; printedAt: string; view: PartsListView };

/** The list on paper: a box to tick for what is ordered, the head again on every page. Never on screen. */
export function OrderSheet({ projectName, zone, printedAt, view }: Props) {
  const { lines, totals, currency, board, spares } = view;
  const cell = "border-t border-rule py-1 align-baseline text-sm";
  const figure = `${cell} mono whitespace-nowrap pl-3 text-right text-xs`;
  return (
    <table className="hidden w-full border-collapse text-left print:table">
      <thead>
        <tr>
          <td colSpan={8} className="pb-2">
            <span className="font-head text-xl font-semibold">Parts to order</span>
            <span className="block text-sm">
              {projectName}
              {board && `, board ${board}`}. {spares.percent} % spares, at least {spares.minimum} of each. Printed{" "}
              {writeDate(printedAt, zone)}.
            </span>
          </td>
        </tr>
        <tr className="text-xs">
          <th className="w-5 py-1" aria-label="Ordered" />
          <th className="py-1 pr-2.5">Part</th>
          <th className="whitespace-nowrap py-1 pl-3 text-right">Needed</th>
          <th className="whitespace-nowrap py-1 pl-3 text-right">Spares</th>
          <th className="whitespace-nowrap py-1 pl-3 text-right">In stock</th>
          <th className="whitespace-nowrap py-1 pl-3 text-right">To buy</th>
          <th className="whitespace-nowrap py-1 pl-3 text-right">Each</th>
          <th className="whitespace-nowrap py-1 pl-3 text-right">Cost, {currency}</th>
        </tr>
      </thead>
      <tbody>
        {lines.map((line) => (
          <tr key={line.part}>
            <td className={cell}>
              {line.toBuy > 0 && <span className="mr-2.5 inline-block size-3 border border-[#000] align-[-1px]" />}
            </td>
            <th scope="row" className={`${cell} font-normal`}>
              <span className="mono text-xs font-semibold">{line.part}</span> {line.description}
            </th>
            <td className={figure}>{line.needed}</td>
            <td className={figure}>{line.spares}</td>
            <td className={figure}>{line.stock}</td>
            <td className={`${figure} font-semibold`}>{line.toBuy > 0 ? line.toBuy : "–"}</td>
            <td className={figure}>{line.priceTyped || "–"}</td>
            <td className={figure}>{line.costMinor ? money(line.costMinor, "").trim() : "–"}</td>
          </tr>
        ))}
      </tbody>
      <tbody>
        <tr>
          <td colSpan={5} className="border-t-2 border-[#000] py-1.5 text-sm">
            {totals.withoutPrice.length > 0 && `Without a price: ${totals.withoutPrice.join(", ")}.`}
          </td>
          <td className="mono border-t-2 border-[#000] py-1.5 pl-3 text-right align-baseline text-xs font-semibold">
            {totals.toBuy}
          </td>
          <td
            colSpan={2}
            className="mono border-t-2 whitespace-nowrap border-[#000] py-1.5 pl-3 text-right align-baseline text-xs font-semibold"
          >
            {money(totals.costMinor, currency)}
          </td>
        </tr>
      </tbody>
    </table>
  );
}
