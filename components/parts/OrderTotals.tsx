import { counted } from "@/components/workshop/counted";
import { money } from "@/lib/part/price";
import type { PartsListView } from "@/lib/parts-list/load-parts-list";

/** What is left to buy and what it costs, with how far the sum can be trusted. */
export function OrderTotals({ view }: { view: PartsListView }) {
  const { totals, lines, currency } = view;
  const parts = lines.filter(({ toBuy }) => toBuy > 0).length;
  const missing = totals.withoutPrice.length;
  return (
    <dl className="grid gap-px overflow-hidden rounded-lg border border-rule bg-rule sm:grid-cols-3">
      <Total name="Left to buy" figure={String(totals.toBuy)}>
        {parts === 0
          ? "everything is in stock"
          : `${totals.toBuy === 1 ? "piece" : "pieces"} of ${counted(parts, "part")}`}
      </Total>
      <Total name="Costs" figure={money(totals.costMinor, currency)}>
        {missing === 0 ? "every price is known" : `and what ${counted(missing, "part")} without a price cost`}
      </Total>
      <Total name="Without a price" figure={String(missing)}>
        {missing === 0 ? "none" : shortList(totals.withoutPrice)}
      </Total>
    </dl>
  );
}

function Total({ name, figure, children }: { name: string; figure: string; children: string }) {
  return (
    <div className="bg-sheet px-4 py-3">
      <dt className="text-sm font-semibold text-ink-soft">{name}</dt>
      <dd>
        <span className="mono block text-xl font-semibold">{figure}</span>
        <span className="block text-sm text-ink-soft">{children}</span>
      </dd>
    </div>
  );
}

const shortList = (names: readonly string[]) =>
  names.length <= 4 ? names.join(", ") : `${names.slice(0, 3).join(", ")} and ${names.length - 3} more`;
