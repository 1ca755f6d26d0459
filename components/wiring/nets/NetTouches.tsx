import clsx from "clsx";
import Link from "next/link";
import { Panel } from "@/components/ui/Panel";
import { counted } from "@/components/workshop/counted";
import type { Net, NetPin } from "@/lib/calc/interconnect";
import { formatQuantity } from "@/lib/calc/units";
import { pinAddress } from "../pin-address";

/** Everything that is on the net: each placement with its pins, what it calls them and what they do. */
export function NetTouches({ net, project }: { net: Net; project: string }) {
  const rows = rowsOf(net.pins);
  const places = new Set(net.pins.map(({ placement }) => placement)).size;
  return (
    <Panel
      title="Who is on it"
      note={`${counted(net.pins.length, "pin")} at ${counted(places, "place")}`}
      padding="none"
    >
      <table className="w-full border-collapse border-t border-rule text-left text-[0.9375rem]">
        <thead className="text-sm text-ink-soft max-sm:sr-only">
          <tr>
            <th scope="col" className="py-1.5 pl-4 pr-3 font-semibold sm:pl-5">
              Where
            </th>
            <th scope="col" className="px-3 font-semibold">
              Pin
            </th>
            <th scope="col" className="px-3 font-semibold">
              Role
            </th>
            <th scope="col" className="px-3 font-semibold max-sm:hidden">
              Family
            </th>
          </tr>
        </thead>
        <tbody>
          {rows.map(({ label, slot, isFirst, pins, role, family, signal }) => (
            <tr
              key={`${label} ${pins[0]?.connectorId} ${pins[0]?.pin}`}
              className="border-t border-rule align-baseline"
            >
              <th scope="row" className="py-2 pl-4 pr-3 font-normal sm:pl-5">
                <span className={clsx("mono text-sm font-semibold", !isFirst && "sr-only")}>{label}</span>
                {isFirst && slot !== null && <span className="block text-xs text-ink-soft">slot {slot}</span>}
              </th>
              <td className="px-3 py-2">
                <span className="flex flex-wrap gap-x-3 gap-y-0.5">
                  {pins.map((pin) => (
                    <Link
                      key={`${pin.connectorId} ${pin.pin}`}
                      href={pinAddress(project, pin)}
                      className="link mono inline-flex min-h-6 items-center gap-1 whitespace-nowrap text-sm"
                    >
                      <span>{pin.connector}</span> <span>{pin.pin}</span>
                    </Link>
                  ))}
                </span>
                {signal !== net.name && signal !== "" && (
                  <span className="mono block text-xs text-ink-soft">as {signal}</span>
                )}
              </td>
              <td className="px-3 py-2 text-sm">
                {role}
                {family && <span className="mono ml-2 sm:hidden">{family}</span>}
              </td>
              <td className="mono px-3 py-2 text-sm max-sm:hidden">{family}</td>
            </tr>
          ))}
        </tbody>
      </table>
    </Panel>
  );
}

function does({ role, enableGroup, loads, pullUpOhm, isMated }: NetPin): string {
  const parts = [
    role,
    enableGroup === "" ? "" : `group ${enableGroup}`,
    loads > 1 ? `${loads} inputs` : "",
    pullUpOhm === null ? "" : `pull-up ${formatQuantity({ value: pullUpOhm, unit: "Ω" })}`,
    isMated ? "" : "meets nothing",
  ];
  return parts.filter((part) => part !== "").join(", ");
}

type Row = {
  label: string;
  slot: number | null;
  /** Of its place. */
  isFirst: boolean;
  pins: NetPin[];
  role: string;
  family: string;
  signal: string;
};

/** The backplane, then the slots in their order, then what stands beside; pins of one place that do the same are one row. */
function rowsOf(pins: readonly NetPin[]): Row[] {
  const order = ({ kind, slot }: NetPin) => (kind === "backplane" ? -1 : (slot ?? 999));
  const rows = new Map<string, Row>();
  const places = new Set<string>();
  for (const pin of [...pins].sort((a, b) => order(a) - order(b))) {
    const { placement, label, slot, family, signal } = pin;
    const role = does(pin);
    const key = [placement, role, family, signal].join(" / ");
    const row = rows.get(key);
    if (row) row.pins.push(pin);
    else rows.set(key, { label, slot, isFirst: !places.has(placement), pins: [pin], role, family, signal });
    places.add(placement);
  }
  return [...rows.values()];
}
