"use client";

import { useRouter } from "next/navigation";
import { useRef, useState } from "react";
import { ConfirmDialog } from "@/components/ui/ConfirmDialog";
import { Dialog } from "@/components/ui/Dialog";
import { toast } from "@/components/ui/toast-store";
import { counted } from "@/components/workshop/counted";
import type { ConnectorView, WiringView } from "@/lib/pin-map/load-wiring";
import type { ConnectorActs } from "./connector-acts";
import { NONE, type TypedConnector } from "./connector-fields";
import { ConnectorForm } from "./ConnectorForm";
import { CopySlots } from "./CopySlots";

export type OpenDialog = "add" | "edit" | "copy" | "remove" | undefined;

type Props = {
  project: string;
  view: WiringView;
  chosen: ConnectorView | undefined;
  acts: ConnectorActs;
  open: OpenDialog;
  onOpen: (open: OpenDialog) => void;
  pinsOf: (connectorId: string) => number;
  unsavedOf: (connectorId: string) => number;
  /** Shows a connector by its address, "CON.J1"; the first one where there is none. */
  onShow: (address: string | null) => void;
};

/** Adding, changing, copying and removing a connector. */
export function ConnectorDialogs({ project, view, chosen, acts, open, onOpen, onShow, pinsOf, unsavedOf }: Props) {
  const router = useRouter();
  const removal = useRef(crypto.randomUUID());
  const [key, setKey] = useState(0);
  const { boards, slots, connectors, machine } = view;
  const close = () => onOpen(undefined);
  const steer = (dialog: OpenDialog) => ({
    isOpen: open === dialog,
    onOpenChange: (isOpen: boolean) => {
      onOpen(isOpen ? dialog : undefined);
      setKey((before) => before + 1);
    },
  });

  function done(name: string, said: string) {
    close();
    toast({ text: said });
    onShow(name);
    router.refresh();
  }

  return (
    <>
      <Dialog title="Add a connector" {...steer("add")}>
        <ConnectorForm
          key={key}
          {...{ boards, slots, connectors }}
          fresh={freshConnector(view, chosen)}
          save={(values, { writeId, boardId }) => acts.add({ project, writeId, boardId, ...values })}
          onDone={({ name }) => done(name, `${name.replace(".", " ")} is added.`)}
          onCancel={close}
        />
      </Dialog>
      {chosen && (
        <>
          <Dialog title={`Connector ${chosen.code} ${chosen.reference}`} {...steer("edit")}>
            <ConnectorForm
              key={`${key} ${chosen.id}`}
              {...{ boards, slots, connectors }}
              connector={chosen}
              fresh={freshConnector(view, chosen)}
              save={(values, { writeId, version, position }) =>
                acts.edit({ project, writeId, connectorId: chosen.id, version, position, ...values })
              }
              onDone={({ name }) => done(name, `${name.replace(".", " ")} is saved.`)}
              onCancel={close}
            />
          </Dialog>
          <CopySlots
            {...{ project, slots, connectors, pinsOf }}
            source={chosen}
            copy={acts.copy}
            onDone={() => router.refresh()}
            {...steer("copy")}
          />
          <ConfirmDialog
            title={`Remove ${chosen.code} ${chosen.reference}?`}
            {...steer("remove")}
            consequences={lossOf(chosen, machine, pinsOf(chosen.id), unsavedOf(chosen.id))}
            confirmLabel="Remove the connector"
            onConfirm={async () => {
              const { id: connectorId, version } = chosen;
              const reply = await acts.remove({ project, writeId: removal.current, connectorId, version });
              removal.current = crypto.randomUUID();
              if (!reply.ok) return reply.error.message;
              toast({
                text: `${chosen.code} ${chosen.reference} is removed with ${counted(reply.value.pins, "pin")}.`,
              });
              onShow(null);
              router.refresh();
              return undefined;
            }}
          />
        </>
      )}
    </>
  );
}

function lossOf(chosen: ConnectorView, machine: WiringView["machine"], pins: number, unsaved: number): string[] {
  const joins = machine.matings.filter(
    ({ from, to }) => from.connector === chosen.id || to.connector === chosen.id,
  ).length;
  return [
    pins === 0
      ? "Its pins carry nothing yet."
      : `What its ${counted(pins, "pin")} ${pins === 1 ? "carries" : "carry"} goes with it, for good.`,
    ...(joins > 0
      ? [
          `${counted(joins, "join")} to other connectors ${joins === 1 ? "ends" : "end"}, and the nets with ${joins === 1 ? "it" : "them"}.`,
        ]
      : []),
    ...(unsaved > 0 ? [`${counted(unsaved, "unsaved change")} of it cannot be saved any more.`] : []),
    "Checks that name its pins keep the names.",
  ];
}

/** The next one on the same board, of the same face; on a backplane for the next slot that has none. */
function freshConnector({ boards, connectors, slots }: WiringView, like: ConnectorView | undefined): TypedConnector {
  const boardId = like?.boardId ?? boards[0]?.id ?? "";
  const own = connectors.filter((one) => one.boardId === boardId);
  const isBackplane = boards.find(({ id }) => id === boardId)?.kind === "backplane";
  const free = slots.find(({ id }) => !connectors.some(({ slotId }) => slotId === id));
  const letters = (own[0]?.reference ?? "J1").replace(/\d+$/, "");
  let number = own.length + 1;
  while (own.some(({ reference }) => reference === `${letters}${number}`)) number += 1;
  return {
    boardId,
    reference: `${letters}${number}`,
    type: like?.type ?? "din41612-c64",
    rows: like?.grid?.rows.join(", ") ?? "a, b",
    positions: String(like?.grid?.positions ?? 16),
    pitchMm: String(like?.grid?.pitchMm ?? 2.54),
    slotId: isBackplane ? (free?.id ?? NONE) : NONE,
    takes: like?.takes ?? "J1",
    cabledTo: NONE,
    position: String(own.length + 1),
  };
}
