import type { ReworkView } from "@/lib/rework/rework-view";
import type { Wire } from "@/db/schema/faults";

export type WireLine = { id: string; number: number; wire: Wire; what: string; why: string };

/**
 * The wires that are in, by their number: W2 before W10. Of several reworks of one wire the newest says how it runs, and
 * whether it is still there. Newest first, as they are loaded.
 */
export function wiresOf(reworks: readonly ReworkView[]): WireLine[] {
  const newest = new Map<string, WireLine>();
  for (const { id, number, wire, what, why } of reworks) {
    const name = wire?.number.trim().toUpperCase();
    if (wire && name !== undefined && !newest.has(name)) newest.set(name, { id, number, wire, what, why });
  }
  return [...newest.values()]
    .filter(({ wire }) => !wire.out)
    .sort((a, b) => a.wire.number.localeCompare(b.wire.number, "en", { numeric: true }));
}

/** Which wire runs from where to where, in which colour and why. */
export function WireTable({ wires }: { wires: readonly WireLine[] }) {
  return (
    <table className="w-full border-collapse text-left text-[0.9375rem]">
      <thead className="text-ink-soft text-sm">
        <tr className="border-rule border-b">
          <Head>Wire</Head>
          <Head>From – to</Head>
          <Head>Colour</Head>
          <Head className="max-sm:hidden print:table-cell">Why</Head>
        </tr>
      </thead>
      <tbody>
        {wires.map(({ id, number, wire, what, why }) => (
          <tr key={id} className="border-rule break-inside-avoid border-b align-top last:border-b-0">
            <th scope="row" className="mono py-2 pr-3 font-semibold">
              <a href={`#R${number}`} className="hover:underline">
                {wire.number}
              </a>
            </th>
            <td className="mono py-2 pr-3 text-sm">
              {wire.from} → {wire.to}
              <span className="font-text text-ink-soft block text-sm sm:hidden print:hidden">{why || what}</span>
            </td>
            <td className="py-2 pr-3">{wire.colour || <span className="text-ink-faint">not said</span>}</td>
            <td className="py-2 text-sm max-sm:hidden print:table-cell">{why || what}</td>
          </tr>
        ))}
      </tbody>
    </table>
  );
}

function Head({ children, className = "" }: { children: string; className?: string }) {
  return (
    <th scope="col" className={`pr-3 pb-1.5 font-semibold ${className}`}>
      {children}
    </th>
  );
}
