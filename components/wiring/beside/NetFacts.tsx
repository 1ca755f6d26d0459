"use client";

import type { Side } from "@/lib/calc/connector";
import type { Net, NetPin } from "@/lib/calc/interconnect";
import { MiniFace } from "./MiniFace";
import { partsOf, placeWords } from "./net-words";
import { litAt, type Station } from "./stations";

type Props = {
  net: Net | undefined;
  stations: readonly Station[];
  side: Side;
  hasSeveral: (board: string) => boolean;
  onJump: (pin: NetPin) => void;
};

const FEW = 6;
const FEW_LIT = 3;

/** Who is on the net and what each does there, and where it is in every slot. */
export function NetFacts({ net, stations, side, hasSeveral, onJump }: Props) {
  // Places beside the rack are shown only while the net touches them; the slots always stand in their row.
  const shown = stations.filter((station) => station.isSlot || litAt(station, net).length > 0);
  return (
    <>
      {net && (
        <dl className="grid grid-cols-[max-content_minmax(0,1fr)] gap-x-4 gap-y-1.5 text-sm">
          {partsOf(net).map(({ words, pins }) => (
            <div key={words} className="contents">
              <dt className="pt-0.5 text-ink-soft">{words}</dt>
              <dd className="flex flex-wrap gap-x-1.5 gap-y-1.5">
                {pins.slice(0, FEW).map((one) => (
                  <button
                    key={`${one.placement} ${one.connectorId} ${one.pin}`}
                    type="button"
                    onClick={() => onJump(one)}
                    className="mono min-h-6 rounded-sm border border-rule-strong bg-raised px-1.5 text-xs hover:border-copper hover:text-copper"
                  >
                    {placeWords(one, hasSeveral)} <b className="font-semibold">{one.pin}</b>
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
        aria-label="The same net at every place"
        className="mt-3 grid grid-cols-[repeat(auto-fill,minmax(8.75rem,1fr))] gap-x-3 gap-y-2.5 border-t border-rule pt-3"
      >
        {shown.map((station) => {
          const lit = litAt(station, net);
          return (
            <li key={station.key} className={lit.length > 0 ? "text-ink" : "text-ink-soft"}>
              <MiniFace face={station.face} lit={lit} side={side} />
              <p className="mono mt-1 flex flex-wrap gap-x-1.5 text-2xs">
                <span>{station.label}</span>
                <span>{station.who}</span>
                {lit.length > 0 && (
                  <b className="font-semibold text-copper">
                    {lit.slice(0, FEW_LIT).join(" ")}
                    {lit.length > FEW_LIT && " …"}
                  </b>
                )}
              </p>
            </li>
          );
        })}
      </ul>
    </>
  );
}
