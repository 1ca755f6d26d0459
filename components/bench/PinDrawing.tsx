import { ConnectorFace } from "@/components/ui/glyphs/ConnectorFace";
import { faceOf, findPin, type ConnectorGrid } from "@/lib/calc/connector";

export type BoardFace = {
  connectorType: string | null;
  /** Of a face of one's own. */
  connectorGrid?: ConnectorGrid | null;
  connectorReference: string;
};

/** The connector with the pins lit that the check names. Pins of other connectors are named in words. */
export function PinDrawing({ pins, board }: { pins: readonly string[]; board: BoardFace }) {
  if (pins.length === 0) return null;
  const connector = faceOf({ type: board.connectorType ?? "", grid: board.connectorGrid ?? null });
  const lit = connector ? pins.flatMap((pin) => findPin(connector, board.connectorReference, pin) ?? []) : [];
  const names = <p className="mono text-base">{pins.join("  ")}</p>;
  if (!connector || lit.length === 0)
    return <div className="border-rule bg-raised rounded-md border px-4 py-3">{names}</div>;
  return (
    <figure className="border-rule grid-paper rounded-md border px-3 py-2">
      <ConnectorFace
        face={connector}
        lit={new Set(lit.map((pin) => pin.name))}
        label={`Connector ${board.connectorReference}`}
        className="w-full"
      />
      <figcaption className="mt-1 flex flex-wrap items-baseline gap-x-3 text-sm">
        <span className="text-ink-soft">{board.connectorReference}, from the card side</span>
        {names}
      </figcaption>
    </figure>
  );
}
