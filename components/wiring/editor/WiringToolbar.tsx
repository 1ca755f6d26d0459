"use client";

import { Button as AriaButton } from "react-aria-components";
import { Button } from "@/components/ui/Button";
import { buttonStyle } from "@/components/ui/button-style";
import { Icon } from "@/components/ui/Icon";
import { IconButton } from "@/components/ui/IconButton";
import { Menu, type MenuEntry } from "@/components/ui/Menu";
import type { WiringView } from "@/lib/pin-map/load-wiring";
import type { OpenDialog } from "../connector/ConnectorDialogs";
import { at } from "../grid/selection";
import { placeOf } from "../grid/table-text";
import { ConnectorChooser } from "./ConnectorChooser";
import { useSteady } from "./use-steady";
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
  const show = useSteady((address: string) => {
    void table.setAddress(address);
    grid.go(at(0, placeOf("signal")));
  });
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
      <ConnectorChooser
        {...{ connectors, machine, slots }}
        drafts={state.drafts}
        value={table.isAll ? ALL : table.chosen ? addressOf(table.chosen) : null}
        onChange={show}
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
