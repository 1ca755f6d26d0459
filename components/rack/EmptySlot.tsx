import type { RackSlot } from "@/lib/rack/rack-view";
import { CardLink } from "./CardLink";
import { EdgeConnector } from "./EdgeConnector";
import { slotAddress } from "./rack-addresses";
import type { useSlotWalk } from "./slot-walk";
import { ToMend } from "./ToMend";

type Props = {
  slot: RackSlot;
  project: string | undefined;
  canPlace: boolean;
  stop: ReturnType<ReturnType<typeof useSlotWalk>["stop"]>;
};

/** The outline of the card that would be here. */
export function EmptySlot({ slot, project, canPlace, stop }: Props) {
  const wanted = slot.board ? `Wired for ${slot.board.name}.` : "Takes any card.";
  return (
    <CardLink
      href={project && slotAddress(project, slot.position)}
      {...stop}
      className="ml-3 flex min-w-0 flex-1 items-center rounded-md border border-dashed border-rule-strong bg-sheet/70 no-underline hover:border-ink-soft sm:ml-4"
    >
      <span className="-ml-3 flex max-h-12 self-center sm:-ml-4">
        <EdgeConnector type={slot.board?.connectorType ?? null} isEmpty />
      </span>
      <span className="flex flex-wrap gap-x-3 px-3 py-1.5 text-sm text-ink-soft @3xl:pl-4">
        <span className="font-semibold">empty slot</span>
        <span>
          {wanted} {canPlace ? "Put a unit in." : "Its pins stay open."}
        </span>
        <ToMend board={slot.board} className="mono" />
      </span>
    </CardLink>
  );
}
