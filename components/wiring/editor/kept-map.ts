import type { WiringView } from "@/lib/pin-map/load-wiring";
import { pinTexts } from "@/lib/pin-map/read-pin-row";
import type { KeptMap } from "../draft/pin-drafts";

/** What the server keeps of each connector, as the texts of a table. */
export function keptMapOf({ machine, connectors }: Pick<WiringView, "machine" | "connectors">): KeptMap {
  const designs = new Map(machine.boards.flatMap((board) => board.connectors.map((one) => [one.id, one] as const)));
  return Object.fromEntries(
    connectors.map(({ id, version, notes }) => {
      const pins = designs.get(id)?.pins ?? [];
      const rows = Object.fromEntries(pins.map((pin) => [pin.pin, pinTexts({ ...pin, note: notes[pin.pin] ?? "" })]));
      return [id, { version, rows }] as const;
    }),
  );
}
