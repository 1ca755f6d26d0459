"use client";

import { memo, useMemo } from "react";
import { ComboBox } from "@/components/ui/ComboBox";
import type { WiringView } from "@/lib/pin-map/load-wiring";
import type { Drafts } from "../draft/pin-drafts";
import { addressOf, ALL } from "./use-chosen";

type Props = Pick<WiringView, "connectors" | "machine" | "slots"> & {
  drafts: Drafts;
  /** Address of the shown one, or ALL. */
  value: string | null;
  onChange: (address: string) => void;
};

/** All connectors of the machine, with where each stands and what of it is not saved. */
export const ConnectorChooser = memo(function ConnectorChooser({
  connectors,
  machine,
  slots,
  drafts,
  value,
  onChange,
}: Props) {
  const options = useMemo(() => {
    const whereOf = (code: string) =>
      machine.placements.filter(({ board }) => board === code).map(({ label }) => label);
    const listed = connectors.map((one) => {
      const slot = slots.find(({ id }) => id === one.slotId);
      const changed = Object.keys(drafts[one.id]?.pins ?? {}).length;
      const where = slot ? `slot ${slot.position}` : whereOf(one.code).join(", ");
      const parts = [one.boardName, where, changed > 0 ? `${changed} not saved` : ""].filter((part) => part !== "");
      return { id: addressOf(one), label: `${one.code} ${one.reference}`, description: parts.join(" · ") };
    });
    return [...listed, { id: ALL, label: "All connectors", description: "The whole machine in one table" }];
  }, [connectors, machine, slots, drafts]);
  return (
    <ComboBox
      label="Connector"
      isLabelHidden
      mono
      options={options}
      value={value}
      onChange={(id) => {
        if (id !== null) onChange(id);
      }}
      className="w-full sm:w-52"
    />
  );
});
