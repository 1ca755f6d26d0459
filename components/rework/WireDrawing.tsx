"use client";

import { ConnectorFace } from "@/components/ui/glyphs/ConnectorFace";
import { faceOf, findPin, parsePin } from "@/lib/calc/connector";
import type { BoardConnector } from "@/lib/rework/load-reworks";
import type { Wire } from "@/db/schema/faults";

type Props = { connectors: readonly BoardConnector[]; wires: readonly Wire[] };

/** The connectors of the board with the pins lit where a bodge wire ends. Ends on parts are in the table only. */
export function WireDrawing({ connectors, wires }: Props) {
  const drawn = connectors.flatMap(({ reference, type, grid }) => {
    const face = faceOf({ type, grid });
    if (!face) return [];
    const ends = wires.flatMap((wire) =>
      [wire.from, wire.to].flatMap((end) => {
        // An end without a connector's name ("a14") is one of the edge connector, which comes first.
        const named = parsePin(end)?.connector ?? connectors[0]?.reference;
        const pin =
          named === reference.toUpperCase() || named === reference ? findPin(face, reference, end) : undefined;
        return pin ? [{ wire: wire.number, pin: pin.name }] : [];
      }),
    );
    return ends.length === 0 ? [] : [{ reference, face, ends }];
  });
  if (drawn.length === 0) return null;
  return (
    <div className="flex flex-wrap gap-4">
      {drawn.map(({ reference, face, ends }) => (
        <figure key={reference} className="min-w-0">
          <div className="border-rule grid-paper rounded-md border px-3 py-2">
            <ConnectorFace
              face={face}
              lit={new Set(ends.map(({ pin }) => pin))}
              label={`Connector ${reference}`}
              className="w-full"
            />
          </div>
          <figcaption className="mt-1 text-sm">
            <span className="text-ink-soft">{reference}, from the card side: </span>
            <span className="mono">{ends.map(({ wire, pin }) => `${wire} ${pin}`).join("  ")}</span>
          </figcaption>
        </figure>
      ))}
    </div>
  );
}
