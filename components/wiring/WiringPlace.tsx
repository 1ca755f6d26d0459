"use client";

import { useCallback, useState } from "react";
import type { z } from "zod";
import { Page } from "@/components/shell/Page";
import { Button } from "@/components/ui/Button";
import { ButtonLink } from "@/components/ui/ButtonLink";
import type { Reply } from "@/components/ui/form/reply";
import type { Side } from "@/lib/calc/connector";
import type { FindingView } from "@/lib/finding/load-findings";
import type { acceptFindingInput } from "@/lib/finding/schema";
import type { WiringView } from "@/lib/pin-map/load-wiring";
import { countsSentence } from "./beside/shown-findings";
import type { ConnectorActs } from "./connector/connector-acts";
import { ConnectorDialogs, type OpenDialog } from "./connector/ConnectorDialogs";
import { DraftNotices } from "./editor/DraftNotices";
import { PinsView } from "./editor/PinsView";
import { useWiring } from "./editor/use-wiring";
import { addressOf } from "./editor/use-chosen";
import type { SavePins } from "./editor/use-save-pins";
import { AcceptFinding } from "./findings/DecideFinding";
import { NoConnectors } from "./NoConnectors";

type Accept = (input: z.input<typeof acceptFindingInput>) => Promise<Reply<{ title: string }>>;

type Props = {
  project: string;
  userId: string;
  zone: string;
  view: WiringView;
  /** Of the address: the pin to begin at. */
  startPin: string | undefined;
  canEdit: boolean;
  save: SavePins;
  connectorActs: ConnectorActs;
  canAccept: boolean;
  accept: Accept;
};

/** The pin maps of the machine: table, drawing and findings side by side. */
export function WiringPlace(props: Props) {
  const { project, userId, zone, view, startPin, canEdit, save, connectorActs } = props;
  const wiring = useWiring({ view, shelf: { userId, project }, save, isReadOnly: !canEdit, startPin });
  const [open, setOpen] = useState<OpenDialog>();
  const [side, setSide] = useState<Side>("card");
  const { table, state, store, saving, check, findings } = wiring;
  const { connectors, slots, boards } = view;
  const has = connectors.length > 0;
  const nets = check?.nets.length;
  const file = `/api/projects/${project}/pin-map${table.chosen ? `?connector=${table.chosen.id}` : ""}`;
  const take = `/projects/${project}/wiring/take${table.chosen ? `?connector=${encodeURIComponent(addressOf(table.chosen))}` : ""}`;
  const { accept, canAccept } = props;
  const acceptOf = useCallback(
    (finding: FindingView) => (canAccept ? <AcceptFinding {...{ project, finding, accept }} /> : null),
    [canAccept, project, accept],
  );
  const pinsOf = (id: string) => Object.keys(state.kept[id]?.rows ?? {}).length;
  const unsavedOf = (id: string) => Object.keys(state.drafts[id]?.pins ?? {}).length;
  const figures = `${table.rows.length} pins, ${slots.length} slots${nets === undefined ? "" : `, ${nets} nets`}.`;
  return (
    <Page
      title="Wiring"
      lede={
        has
          ? `${figures} ${canEdit ? "Checked as you type" : "Checked"}: ${countsSentence(findings)}`
          : "Which signal is on which pin of which connector."
      }
      actions={
        has && (
          <>
            <ButtonLink href={file} prefetch={false} download>
              Take out as CSV
            </ButtonLink>
            {canEdit && <ButtonLink href={take}>Take a file</ButtonLink>}
            {canEdit && (
              <Button onPress={() => setOpen("add")} className="max-sm:hidden">
                Add a connector
              </Button>
            )}
          </>
        )
      }
    >
      <div className="flex flex-col gap-4">
        <DraftNotices
          {...{ state, store, zone }}
          failure={saving.failure}
          nameOf={(id) =>
            connectors.filter((one) => one.id === id).map((one) => `${one.code} ${one.reference}`)[0] ?? "a connector"
          }
        />
        {has ? (
          <PinsView {...{ project, view, wiring, side, acceptOf }} onSide={setSide} onOpen={setOpen} />
        ) : (
          <NoConnectors
            project={project}
            hasBoards={boards.length > 0}
            canEdit={canEdit}
            onAdd={() => setOpen("add")}
          />
        )}
      </div>
      {canEdit && (
        <ConnectorDialogs
          {...{ project, view, open, pinsOf, unsavedOf }}
          chosen={table.chosen}
          acts={connectorActs}
          onOpen={setOpen}
          onShow={(address) => void table.setAddress(address)}
        />
      )}
    </Page>
  );
}
