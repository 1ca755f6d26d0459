"use client";

import { ColumnTable } from "@/components/table-file/ColumnTable";
import { Select } from "@/components/ui/Select";
import type { ListColumn } from "@/lib/netlist/guess-pin-columns";
import { PIN_LIST_UNITS } from "@/lib/netlist/schema";
import type { Corrections, NetlistRead } from "./use-netlist-file";

const NAMES: Record<ListColumn, string> = { net: "Net", part: "Part", pin: "Pin", x: "X", y: "Y" };

type Props = { read: NonNullable<NetlistRead["table"]>; correct: (change: Corrections) => void };

/** How a pin list was read; the unit is asked for when it has places. */
export function ColumnsOfList({ read: { table, hasHeadings, mapping, unit }, correct }: Props) {
  return (
    <ColumnTable {...{ table, hasHeadings, mapping, correct }} names={NAMES}>
      {(mapping.includes("x") || mapping.includes("y")) && (
        <Select
          label="Places are in"
          className="w-32"
          options={PIN_LIST_UNITS.map((id) => ({ id, label: id }))}
          value={unit}
          onChange={(id) => correct({ unit: PIN_LIST_UNITS.find((one) => one === id) ?? "mm" })}
        />
      )}
    </ColumnTable>
  );
}
