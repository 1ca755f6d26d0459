"use client";

import { Button as AriaButton } from "react-aria-components";
import { Button } from "@/components/ui/Button";
import { buttonStyle } from "@/components/ui/button-style";
import { ComboBox } from "@/components/ui/ComboBox";
import { Icon } from "@/components/ui/Icon";
import { IconButton } from "@/components/ui/IconButton";
import { Menu, type MenuEntry } from "@/components/ui/Menu";
import type { WiringView } from "@/lib/pin-map/load-wiring";
import type { OpenDialog } from "../connector/ConnectorDialogs";
import { addressOf, ALL } from "./use-chosen";
import type { useWiring } from "./use-wiring";

type Props = {
  view: WiringView;
  wiring: ReturnType<typeof useWiring>;
  onOpen: (open: OpenDialog) => void;
};

/** Which connector is shown, and what one does with it. */
export function WiringToolbar({ view, wiring, onOpen }: Props) {
  const { table, state, grid, unsaved, saving, isReadOnly, saveAll } = wiring;
  const { connectors, machine, slots } = view;
  const whereOf = (code: string) => machine.placements.filter(({ board }) => board === code).map(({ label }) => label);
  const draftOf = (id: string) => Object.keys(state.drafts[id]?.pins ?? {}).length;
  const options = [
    ...connectors.map((one) => {
      const slot = slots.find(({ id }) => id === one.slotId);
      const changed = draftOf(one.id);
      const where = slot ? `slot ${slot.position}` : whereOf(one.code).join(", ");
      const parts = [one.boardName, where, changed > 0 ? `${changed} not saved` : ""].filter((part) => part !== "");
      return { id: addressOf(one), label: `${one.code} ${one.reference}`, description: parts.join(" · ") };
    }),
    { id: ALL, label: "All connectors", description: "The whole machine in one table" },
  ];
  const entries: MenuEntry[] = [
    { id: "edit", label: "Change the connector", onAction: () => onOpen("edit") },
    ...(table.chosen?.slotId
      ? [{ id: "copy", label: "Copy its pins to other slots", onAction: () => onOpen("copy") }]
      : []),
    "line",
    { id: "remove", label: "Remove the connector", isDanger: true, onAction: () => onOpen("remove") },
  ];
  return (
    <div className="flex flex-wrap items-end gap-x-3 gap-y-2.5">
      <ComboBox
        label="Connector"
        isLabelHidden
        mono
        options={options}
        value={table.isAll ? ALL : table.chosen ? addressOf(table.chosen) : null}
        onChange={(id) => {
          if (id === null) return;
          void table.setAddress(id);
          grid.go({ anchor: { row: 0, column: 1 }, focus: { row: 0, column: 1 } });
        }}
        className="w-full sm:w-52"
      />
      {!isReadOnly && (
        <div className="flex flex-1 flex-wrap items-center gap-1.5 max-sm:hidden">
          {table.chosen && (
            <Menu
              label="This connector"
              placement="bottom start"
              entries={entries}
              trigger={
                <AriaButton
                  aria-label="What to do with this connector"
                  className={buttonStyle("plain", "md", "px-2.5")}
                >
                  <Icon name="more" />
                </AriaButton>
              }
            />
          )}
          <span className="flex-1" />
          <IconButton icon="undo" label="Undo" onPress={grid.undo} isDisabled={state.history.past.length === 0} />
          <IconButton
            icon="undo"
            label="Do again"
            className="-scale-x-100"
            onPress={grid.redo}
            isDisabled={state.history.future.length === 0}
          />
          <Button kind="primary" isPending={saving.isSaving} isDisabled={unsaved === 0} onPress={() => void saveAll()}>
            {unsaved === 0 ? "All saved" : `Save ${unsaved} ${unsaved === 1 ? "pin" : "pins"}`}
          </Button>
        </div>
      )}
    </div>
  );
}
