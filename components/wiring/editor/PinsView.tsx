"use client";

import { useCallback, useMemo } from "react";
import { useMedia } from "@/components/ui/use-media";
import type { Side } from "@/lib/calc/connector";
import type { WiringView } from "@/lib/pin-map/load-wiring";
import { FacePanel } from "../beside/FacePanel";
import type { AcceptOf } from "../beside/FindingLine";
import { FindingsBeside } from "../beside/FindingsBeside";
import { driversOf, labelsOf } from "../beside/net-words";
import { NetFacts } from "../beside/NetFacts";
import { NetPanel } from "../beside/NetPanel";
import { stationsOf } from "../beside/stations";
import type { OpenDialog } from "../connector/ConnectorDialogs";
import { placeOf, type PinKey } from "../grid/table-text";
import { at } from "../grid/selection";
import { GridFoot } from "./GridFoot";
import { PinGrid } from "./PinGrid";
import { PinList } from "./PinList";
import type { RowView } from "./row-views";
import { useSteady } from "./use-steady";
import type { useWiring } from "./use-wiring";
import { WiringToolbar } from "./WiringToolbar";

type Props = {
  project: string;
  view: WiringView;
  wiring: ReturnType<typeof useWiring>;
  side: Side;
  onSide: (side: Side) => void;
  onOpen: (open: OpenDialog) => void;
  acceptOf: AcceptOf;
};

/** Face, table and findings, and under them the net of the pin one is at. */
export function PinsView({ project, view, wiring, side, onSide, onOpen, acceptOf }: Props) {
  const { table, grid, state, known, findings, focused, lit, isReadOnly, scroller, goTo } = wiring;
  const { chosen, face, isAll, rows } = table;
  const { machine, connectors, slots } = view;
  const stations = useMemo(() => stationsOf({ machine, connectors, slots }), [machine, connectors, slots]);
  const words = useMemo(() => wordsOf(machine, known.families), [machine, known]);
  const net = wiring.netOf(lit);
  const name = chosen ? `${chosen.code} ${chosen.reference}` : "the machine";
  const driversAt = (row: RowView) => {
    const own = wiring.netOf(row);
    return own ? labelsOf(driversOf(own)) : "";
  };
  const litHere = new Set(net?.pins.filter(({ connectorId }) => connectorId === chosen?.id).map(({ pin }) => pin));
  const litName = lit && `${connectors.find(({ id }) => id === lit.connectorId)?.code ?? ""} ${lit.pin}`;

  const faceOf = (orientation: "standing" | "lying") =>
    chosen &&
    face && (
      <FacePanel
        {...{ name, face, side, onSide, orientation }}
        roles={wiring.roles}
        lit={litHere}
        marked={lit?.pin}
        placements={wiring.placementsOf(chosen.id)}
        placement={wiring.placed(chosen.id)}
        onPlacement={wiring.setPlacement}
        onPin={wiring.setHovered}
        onPick={(pin) => goTo({ connectorId: chosen.id, pin })}
      />
    );

  const several = useMemo(() => boardsWithSeveral(connectors), [connectors]);
  const hasSeveral = useCallback((board: string) => several.has(board), [several]);
  const jump = useSteady((pin: PinKey) => goTo(pin));
  const doIt = useSteady(wiring.doWhatItSays);
  const facts = { net, stations, side, hasSeveral, onJump: jump };
  // Drawn for a phone only: hundreds of rows that nobody sees would be drawn with every key.
  const isNarrow = useMedia("(width < 40rem)");

  return (
    <>
      <div className="grid grid-cols-1 items-stretch gap-4 xl:grid-cols-[auto_minmax(0,1fr)_19rem] xl:grid-rows-[minmax(0,54rem)]">
        {chosen && face && (
          <div className="rounded-lg border border-rule bg-sheet p-4 relative max-xl:hidden xl:w-44 xl:overflow-y-auto">
            {faceOf("standing")}
          </div>
        )}
        <section
          aria-label={`Pins of ${name}`}
          className={`flex min-h-0 min-w-0 flex-col rounded-lg border border-rule bg-sheet ${chosen && face ? "" : "xl:col-span-2"}`}
        >
          <div className="px-4 py-3 sm:px-5">
            <WiringToolbar {...{ view, wiring, onOpen }} />
          </div>
          <div className="border-t border-rule px-4 py-3.5 xl:hidden sm:px-5">{faceOf("lying")}</div>
          <PinGrid
            label={`Pins of ${name}`}
            {...{ grid, rows, words, isReadOnly, scroller }}
            table={table.table}
            rails={known.rails}
            hasSeveral={isAll}
            weightOf={wiring.weightOf}
            driversOf={driversAt}
            className="max-h-[34rem] min-h-60 flex-1 border-t border-rule max-sm:hidden xl:max-h-none"
          />
          {isNarrow && (
            <div className="px-4 py-3">
              <PinList
                {...{ name, rows }}
                at={grid.selection.focus.row}
                labelAt={table.table.labelAt}
                rails={known.rails}
                weightOf={wiring.weightOf}
                driversOf={driversAt}
                onPick={(row) => grid.go(at(row, placeOf("signal")))}
                detail={<NetFacts {...facts} />}
              />
            </div>
          )}
          <div className="max-sm:hidden">
            <GridFoot said={grid.said} isReadOnly={isReadOnly} unsaved={Object.keys(state.drafts).length} />
          </div>
        </section>
        <FindingsBeside
          {...{ project, findings }}
          connector={chosen && { id: chosen.id, name }}
          at={focused}
          canEdit={!isReadOnly}
          hasSeveral={hasSeveral}
          acceptOf={acceptOf}
          onJump={jump}
          onDo={doIt}
        />
      </div>
      {litName !== undefined && <NetPanel {...facts} project={project} pin={litName} />}
    </>
  );
}

/** Of these a pin is named with its connector. */
function boardsWithSeveral(connectors: WiringView["connectors"]): ReadonlySet<string> {
  const codes = connectors.map(({ code }) => code);
  return new Set(codes.filter((code, index) => codes.indexOf(code) !== index));
}

const inOrder = (words: Iterable<string>) =>
  [...new Set(words)]
    .filter((word) => word !== "")
    .sort((one, other) => one.localeCompare(other, "en", { numeric: true }));

function wordsOf({ boards, signals }: WiringView["machine"], families: readonly string[]) {
  const pins = boards.flatMap(({ connectors }) => connectors.flatMap((connector) => connector.pins));
  return {
    families,
    signals: inOrder([...signals.map(({ name }) => name), ...pins.map(({ signal }) => signal)]),
    groups: inOrder(pins.map(({ enableGroup }) => enableGroup)),
  };
}
