"use client";

import Link from "next/link";
import type { Side } from "@/lib/calc/connector";
import type { Net, NetPin } from "@/lib/calc/interconnect";
import { netAddress } from "../pin-address";
import { MiniFace } from "./MiniFace";
import { partsOf } from "./net-words";
import { litAt, type Station } from "./stations";

type Props = {
  project: string;
  /** "CON J1 a10" */
  pin: string;
  net: Net | undefined;
  stations: readonly Station[];
  side: Side;
  onJump: (pin: NetPin) => void;
};

const FEW = 6;

/** The net of the pin one is at: who else is on it, and where it is in every slot. */
export function NetPanel({ project, pin, net, stations, side, onJump }: Props) {
  // Places beside the rack are shown only while the net touches them; the slots always stand in their row.
  const shown = stations.filter(
    (station) => station.who !== "" || station.label.startsWith("slot") || litAt(station, net).length > 0,
  );
  return (
    <section aria-label="The net of this pin" className="rounded-lg border border-rule bg-sheet px-4 py-3.5 sm:px-5">
      <div className="flex flex-wrap items-baseline gap-x-3 gap-y-1">
        <h2 className="text-lg">
          {net && net.name !== "" ? (
            <Link href={netAddress(project, net.id)} className="mono link text-[0.9375em]">
              {net.name}
            </Link>
          ) : (
            <span className="mono text-[0.9375em]">{pin}</span>
          )}
        </h2>
        <p aria-live="polite" className="text-sm text-ink-soft">
          {net
            ? `${pin} and ${net.pins.length - 1} more pins on ${net.placements.length} boards`
            : `${pin} is on no net.`}
        </p>
      </div>
      {net && (
        <dl className="mt-2 grid grid-cols-[max-content_minmax(0,1fr)] gap-x-4 gap-y-1.5 text-sm">
          {partsOf(net).map(({ words, pins }) => (
            <div key={words} className="contents">
              <dt className="pt-0.5 text-ink-soft">{words}</dt>
              <dd className="flex flex-wrap gap-x-1.5 gap-y-1">
                {pins.slice(0, FEW).map((one) => (
                  <button
                    key={`${one.placement} ${one.connectorId} ${one.pin}`}
                    type="button"
                    onClick={() => onJump(one)}
                    className="mono rounded-sm border border-rule-strong bg-raised px-1.5 py-0.5 text-xs hover:border-copper hover:text-copper"
                  >
                    {one.label} <b className="font-semibold">{one.pin}</b>
                    {one.family !== "" && <span className="text-ink-soft"> {one.family}</span>}
                  </button>
                ))}
                {pins.length > FEW && (
                  <span className="pt-0.5 text-xs text-ink-soft">and {pins.length - FEW} more</span>
                )}
              </dd>
            </div>
          ))}
        </dl>
      )}
      <ul
        className="mt-3 flex flex-wrap gap-x-5 gap-y-2.5 border-t border-rule pt-3"
        aria-label="The same net at every place"
      >
        {shown.map((station) => {
          const lit = litAt(station, net);
          return (
            <li key={station.key} className={lit.length > 0 ? "text-ink" : "text-ink-soft"}>
              <MiniFace face={station.face} lit={lit} side={side} />
              <p className="mono mt-1 flex gap-2 text-2xs">
                <span>{station.label}</span>
                <span>{station.who}</span>
                {lit.length > 0 && (
                  <b className="ml-auto font-semibold text-copper">
                    {lit.slice(0, 3).join(" ")}
                    {lit.length > 3 && " …"}
                  </b>
                )}
              </p>
            </li>
          );
        })}
      </ul>
    </section>
  );
}
