"use client";

import clsx from "clsx";
import Link from "next/link";
import type { RackSlot, RackView } from "@/lib/rack/rack-view";
import { BackplaneFoot } from "./BackplaneFoot";
import { CardStages } from "./CardStages";
import { EdgeConnector } from "./EdgeConnector";
import { slotAddress, unitAddress } from "./rack-addresses";
import { useSlotWalk } from "./slot-walk";
import { ToMend } from "./ToMend";

type Props = { rack: RackView; project: string; nextSerial: string | undefined; className?: string };

/** Width of the narrowest slot in px; the drawing scrolls sideways when the machine is wider than the sheet. */
const NARROWEST = 88;

/** Cards stand side by side on the spine, seen from above the front; slot 1 on the left. */
export function StandingDrawing({ rack, project, nextSerial, className }: Props) {
  const walk = useSlotWalk(rack.slots.length);
  const smallest = Math.min(...rack.slots.map((slot) => slot.pitchHp));
  const columns = rack.slots
    .map((slot) => `minmax(${(slot.pitchHp / smallest) * NARROWEST}px, ${slot.pitchHp}fr)`)
    .join(" ");
  return (
    <div className={clsx("grid-paper @container rounded-lg border border-rule px-4 pb-3 pt-5", className)}>
      <div className="overflow-x-auto pt-2">
        <div
          role="table"
          aria-label="Slots from the left, with the unit in each"
          onKeyDown={walk.onKeyDown}
          className="relative min-w-fit"
        >
          <div role="rowgroup" className="sr-only">
            <div role="row">
              <span role="columnheader">Slot</span>
              <span role="columnheader">Card</span>
            </div>
          </div>
          <div role="rowgroup" className="grid" style={{ gridTemplateColumns: columns }}>
            {rack.slots.map((slot, index) => (
              <div key={slot.id} role="row" className="flex min-w-0 flex-col px-1">
                <div role="cell" className="flex min-h-96 flex-1 flex-col">
                  <StandingCard
                    slot={slot}
                    project={project}
                    isNext={slot.unit !== null && slot.unit.serial === nextSerial}
                    stop={walk.stop(index)}
                  />
                </div>
                <span role="rowheader" className="mono order-last pt-2.5 text-center text-sm text-ink-soft">
                  <span className="sr-only">Slot </span>
                  {slot.position}
                </span>
                <span aria-hidden="true" className="-mx-1 h-5 bg-mask" />
              </div>
            ))}
          </div>
        </div>
      </div>
      <BackplaneFoot backplane={rack.backplane} project={project} isStanding />
    </div>
  );
}

type CardProps = {
  slot: RackSlot;
  project: string;
  isNext: boolean;
  stop: ReturnType<ReturnType<typeof useSlotWalk>["stop"]>;
};

function StandingCard({ slot, project, isNext, stop }: CardProps) {
  const { unit } = slot;
  if (!unit) {
    return (
      <Link
        href={slotAddress(project, slot.position)}
        {...stop}
        className="relative -mb-2 flex flex-1 flex-col justify-between rounded-md border border-dashed border-rule-strong bg-sheet/70 p-2 text-sm leading-snug text-ink-soft no-underline hover:border-ink-soft"
      >
        <span>
          <span className="block font-semibold">empty slot</span>
          {slot.board ? `Wired for ${slot.board.name}.` : "Takes any card."}
          <ToMend board={slot.board} className="mono mt-1 block" />
        </span>
        <span className="-mb-3.5 flex justify-center">
          <EdgeConnector type={slot.board?.connectorType ?? null} across isEmpty />
        </span>
      </Link>
    );
  }
  return (
    <Link
      href={unitAddress(project, unit.serial)}
      {...stop}
      className={clsx(
        "relative -mb-2 flex flex-1 flex-col gap-3 rounded-md border bg-raised p-2 no-underline shadow-lift transition-colors",
        isNext ? "border-copper ring-3 ring-copper/20" : "border-rule-strong hover:border-ink-soft",
      )}
    >
      {isNext && (
        <span className="absolute -top-2.5 left-1/2 z-10 -translate-x-1/2 whitespace-nowrap rounded-sm bg-copper px-1.5 text-2xs font-semibold leading-[1.125rem] text-on-copper">
          next
        </span>
      )}
      <span className="flex min-h-16 flex-col gap-0.5">
        <span className="hyphens-auto font-head text-[0.9375rem] font-semibold leading-tight tracking-tight">
          {unit.board.name}
        </span>
        <span className="mono text-xs font-semibold leading-tight">{unit.serial}</span>
        <span className="mono text-2xs leading-tight text-ink-soft">rev {unit.revision}</span>
        <ToMend board={unit.board} className="mono" />
      </span>
      <span className="flex-1">
        <CardStages unit={unit} layout="flow" className="flex-col [&>li]:w-full" />
      </span>
      <span className="-mb-4 flex justify-center">
        <EdgeConnector type={unit.board.connectorType} across />
      </span>
    </Link>
  );
}
