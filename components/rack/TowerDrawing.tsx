"use client";

import clsx from "clsx";
import type { RackSlot, RackView } from "@/lib/rack/rack-view";
import { CardLink } from "./CardLink";
import { BackplaneFoot } from "./BackplaneFoot";
import { CardStages, stageRoom } from "./CardStages";
import { EdgeConnector } from "./EdgeConnector";
import { EmptySlot } from "./EmptySlot";
import { unitAddress } from "./rack-addresses";
import { useSlotWalk } from "./slot-walk";
import { ToMend } from "./ToMend";

type Props = {
  rack: Pick<RackView, "slots" | "backplane">;
  /** Undefined: a picture without links, as on the landing page. */
  project: string | undefined;
  nextSerial: string | undefined;
  canPlace: boolean;
  className?: string;
};

/** Height of the narrowest slot in px; wider ones are drawn wider in proportion, so pitch is true from card to card. */
const NARROWEST = 78;

/**
 * Cards lie one above the other on the spine. The same elements are the table that a screen reader gets: one row a
 * slot. On a narrow screen the strips go under the name and it reads as a list in slot order.
 */
export function TowerDrawing({ rack, project, nextSerial, canPlace, className }: Props) {
  const walk = useSlotWalk(rack.slots.length);
  const room = stageRoom([...rack.slots.map((slot) => slot.unit), rack.backplane?.unit]);
  const smallest = Math.min(...rack.slots.map((slot) => slot.pitchHp));
  return (
    <div className={clsx("grid-paper @container rounded-lg border border-rule px-2 pb-3 pt-4 sm:px-5", className)}>
      <div
        role="table"
        aria-label="Slots from the top, with the unit in each"
        onKeyDown={walk.onKeyDown}
        className="relative"
      >
        <div role="rowgroup" className="sr-only">
          <div role="row">
            <span role="columnheader">Slot</span>
            <span role="columnheader">Card</span>
          </div>
        </div>
        <span aria-hidden="true" className="absolute inset-y-0 left-7 w-3.5 rounded-sm bg-mask sm:left-9 sm:w-5" />
        <div role="rowgroup" className="flex flex-col">
          {rack.slots.map((slot, index) => (
            <SlotRow
              key={slot.id}
              slot={slot}
              project={project}
              isNext={slot.unit !== null && slot.unit.serial === nextSerial}
              canPlace={canPlace}
              room={room}
              height={(slot.pitchHp / smallest) * NARROWEST}
              stop={walk.stop(index)}
            />
          ))}
        </div>
      </div>
      <BackplaneFoot backplane={rack.backplane} project={project} room={room} />
    </div>
  );
}

type RowProps = {
  slot: RackSlot;
  project: string | undefined;
  isNext: boolean;
  canPlace: boolean;
  height: number;
  room: readonly number[];
  stop: ReturnType<ReturnType<typeof useSlotWalk>["stop"]>;
};

function SlotRow({ slot, project, isNext, canPlace, height, room, stop }: RowProps) {
  const { unit } = slot;
  return (
    <div
      role="row"
      className="relative grid grid-cols-[1.75rem_minmax(0,1fr)] items-stretch py-1 sm:grid-cols-[2.25rem_minmax(0,1fr)]"
      style={{ minHeight: height }}
    >
      <span role="rowheader" className="mono self-center pr-2 text-right text-sm text-ink-soft">
        <span className="sr-only">Slot </span>
        {slot.position}
      </span>
      <div role="cell" className="flex min-w-0">
        {unit ? (
          <CardLink
            href={project && unitAddress(project, unit.serial)}
            {...stop}
            className={clsx(
              "group relative ml-3 flex min-w-0 flex-1 items-center rounded-md border bg-raised no-underline shadow-lift transition-colors sm:ml-4",
              isNext ? "border-copper ring-3 ring-copper/20" : "border-rule-strong hover:border-ink-soft",
            )}
          >
            {isNext && <NextMark />}
            <span className="-ml-3 flex max-h-[4.5rem] self-center sm:-ml-4">
              <EdgeConnector type={unit.board.connectorType} />
            </span>
            <span className="grid min-w-0 flex-1 items-center gap-x-4 gap-y-2 py-2.5 pl-3 pr-3 @3xl:grid-cols-[minmax(9rem,1.15fr)_5.5rem_minmax(25rem,2.9fr)] @3xl:pl-4">
              <CardName slot={slot} />
              <span className="mono flex flex-wrap gap-x-2.5 text-sm leading-tight @3xl:flex-col">
                <span className="font-semibold">{unit.serial}</span>
                <span className="text-xs text-ink-soft">rev {unit.revision}</span>
                <ToMend board={unit.board} />
              </span>
              <CardStages unit={unit} room={room} />
            </span>
          </CardLink>
        ) : (
          <EmptySlot slot={slot} project={project} canPlace={canPlace} stop={stop} />
        )}
      </div>
    </div>
  );
}

function CardName({ slot }: { slot: RackSlot }) {
  const name = slot.unit?.board.name ?? "";
  const detail = slot.label || slot.unit?.board.summary;
  return (
    <span className="flex min-w-0 flex-col">
      <span className="font-head text-[1.0625rem] font-semibold leading-tight tracking-tight">{name}</span>
      {detail && <span className="line-clamp-2 text-sm leading-snug text-ink-soft">{detail}</span>}
    </span>
  );
}

export function NextMark() {
  return (
    <span className="absolute -top-2.5 right-3 z-10 rounded-sm bg-copper px-2 text-2xs font-semibold leading-[1.125rem] text-on-copper">
      next on the bench
    </span>
  );
}
