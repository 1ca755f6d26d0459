"use client";

import { ConnectorFace } from "@/components/ui/glyphs/ConnectorFace";
import { RadioGroup } from "@/components/ui/RadioGroup";
import { Select } from "@/components/ui/Select";
import type { Connector, Orientation, Side } from "@/lib/calc/connector";
import type { PinRole, Placement } from "@/lib/calc/interconnect";
import { RoleLegend } from "./RoleLegend";

type Props = {
  name: string;
  face: Connector;
  roles: Readonly<Record<string, PinRole>>;
  lit: ReadonlySet<string>;
  marked: string | undefined;
  side: Side;
  onSide: (side: Side) => void;
  placements: readonly Placement[];
  placement: string | undefined;
  onPlacement: (id: string) => void;
  onPin: (pin: string | undefined) => void;
  onPick: (pin: string) => void;
  orientation: Orientation;
};

const SIDES = [
  { id: "card", label: "Card side" },
  { id: "solder", label: "Solder side" },
];

/** The connector to scale, pins by what they do; the net of the pin one is at is lit. */
export function FacePanel(props: Props) {
  const { name, face, placements, orientation } = props;
  const drawing = (
    <ConnectorFace
      face={face}
      side={props.side}
      orientation={orientation}
      roles={props.roles}
      lit={props.lit}
      marked={props.marked}
      onPin={props.onPin}
      onPick={props.onPick}
      label={`Connector ${name}`}
      className={orientation === "lying" ? "mx-auto min-w-[35rem]" : "mx-auto"}
    />
  );
  return (
    <section aria-label={`Face of ${name}`} className="flex flex-col gap-3">
      <div className="flex flex-wrap items-center gap-x-5 gap-y-2.5">
        <RadioGroup
          label="Seen from"
          isLabelHidden
          isInRow
          options={SIDES}
          value={props.side}
          onChange={(side) => props.onSide(side === "solder" ? "solder" : "card")}
        />
        {placements.length > 1 && (
          <Select
            label="Where it sits"
            isLabelHidden
            options={placements.map(({ id, label, slot }) => ({
              id,
              label,
              ...(slot === null ? {} : { description: `slot ${slot}` }),
            }))}
            value={props.placement ?? null}
            onChange={props.onPlacement}
            className="w-full min-w-36 max-w-56 flex-1"
          />
        )}
      </div>
      {orientation === "lying" ? (
        // On a phone the drawing keeps its size and moves under the finger.
        <div role="group" aria-label={`Drawing of ${name}`} tabIndex={0} className="overflow-x-auto rounded">
          {drawing}
        </div>
      ) : (
        drawing
      )}
      <RoleLegend roles={[...new Set(Object.values(props.roles))]} />
    </section>
  );
}
