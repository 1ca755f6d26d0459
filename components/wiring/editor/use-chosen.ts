"use client";

import { useQueryState } from "nuqs";
import { useMemo, useState } from "react";
import type { ConnectorView, WiringView } from "@/lib/pin-map/load-wiring";
import type { KnownNames } from "@/lib/pin-map/read-cell";
import type { PinState } from "../draft/pin-store";
import { findPin } from "@/lib/calc/connector";
import type { TableText } from "../grid/table-text";
import { rowCache, type ConnectorRows, type RowView } from "./row-views";

export const ALL = "all";

/** As it stands in the address: "CON.J1". */
export const addressOf = ({ code, reference }: Pick<ConnectorView, "code" | "reference">): string =>
  `${code}.${reference}`;

/** Which connector is shown, its rows as they stand, and the table that the editing functions see. */
export function useChosen(view: WiringView, state: PinState, known: KnownNames) {
  const [address, setAddress] = useQueryState("connector", { history: "push", scroll: false });
  const [readRows] = useState(rowCache);
  const { connectors, machine } = view;
  const listed = useMemo(() => {
    const faces = new Map(
      machine.boards.flatMap((board) => board.connectors.map(({ id, face }) => [id, face] as const)),
    );
    return connectors.map((one): ConnectorRows => ({
      id: one.id,
      name: `${one.code} ${one.reference}`,
      face: faces.get(one.id),
    }));
  }, [connectors, machine]);

  const wanted = address?.toLowerCase();
  const isAll = wanted === ALL;
  const found = connectors.find((one) => addressOf(one).toLowerCase() === wanted || one.id === wanted);
  const chosen = isAll ? undefined : (found ?? connectors[0]);

  const rowsOf = (connectorId: string): RowView[] => {
    const one = listed.find(({ id }) => id === connectorId);
    return one ? readRows(one, state.kept, state.drafts[connectorId], known) : [];
  };
  const rows = isAll ? listed.flatMap(({ id }) => rowsOf(id)) : chosen ? rowsOf(chosen.id) : [];
  const face = listed.find(({ id }) => id === chosen?.id)?.face;
  const table: TableText = {
    rows,
    textsAt: (row) => rows[row]?.texts ?? EMPTY,
    labelAt: (row) => labelOf(rows[row], isAll),
    rowNamed: (text) => (isAll ? rowNamed(rows, text) : rowOfPin(rows, chosen, face, text)),
  };
  return { chosen, isAll, rows, rowsOf, table, face, listed, setAddress };
}

const EMPTY = { signal: "", role: "", family: "", loads: "", enableGroup: "", pullUpOhm: "", note: "" };

const labelOf = (row: RowView | undefined, isAll: boolean): string =>
  row === undefined ? "" : isAll ? `${row.connector} ${row.pin}` : row.pin;

const plain = (text: string) =>
  text
    .trim()
    .toLowerCase()
    .replace(/[\s.:/-]+/g, " ");

function rowNamed(rows: readonly RowView[], text: string): number | undefined {
  const named = plain(text);
  const index = rows.findIndex((row) => plain(`${row.connector} ${row.pin}`) === named);
  return index < 0 ? undefined : index;
}

function rowOfPin(
  rows: readonly RowView[],
  chosen: ConnectorView | undefined,
  face: ConnectorRows["face"],
  text: string,
) {
  const pin = chosen && face ? findPin(face, chosen.reference, text)?.name : undefined;
  const index = rows.findIndex((row) => row.pin === (pin ?? text.trim()));
  return index < 0 ? undefined : index;
}
