"use client";

import { useRouter } from "next/navigation";
import { useEffect, useMemo, useRef, useState } from "react";
import { toast } from "@/components/ui/toast-store";
import { netsByPin, type PinRole } from "@/lib/calc/interconnect";
import type { WiringView } from "@/lib/pin-map/load-wiring";
import { isEmptyRow, PIN_COLUMNS } from "@/lib/pin-map/pin-columns";
import { impliedRole, readRole } from "@/lib/pin-map/pin-role";
import { shownFindings, weightsByPin, type ShownFinding } from "../beside/shown-findings";
import { changedPins as pinsToCheck } from "../check/changed-pins";
import { useMachineCheck } from "../check/use-machine-check";
import type { ShelfOf } from "../draft/draft-shelf";
import { changedPins, shownTexts } from "../draft/pin-drafts";
import { conflictsOf } from "../draft/pin-store";
import { at } from "../grid/selection";
import { placeOf, type PinKey } from "../grid/table-text";
import { changesOfEdits } from "./edit-changes";
import { focusCell } from "./focus-cell";
import { keptMapOf } from "./kept-map";
import type { RowView } from "./row-views";
import { addressOf, useChosen } from "./use-chosen";
import { usePinGrid } from "./use-pin-grid";
import { usePinStore } from "./use-pin-store";
import { useSavePins, type SavePins } from "./use-save-pins";
import { useSaveKey } from "./use-save-key";

type Given = { view: WiringView; shelf: ShelfOf; save: SavePins; isReadOnly: boolean; startPin: string | undefined };

/** Everything that the place of the pins knows and does, in one piece: the parts below only draw it. */
export function useWiring({ view, shelf, save, isReadOnly, startPin }: Given) {
  const router = useRouter();
  const { machine, connectors } = view;
  const kept = useMemo(() => keptMapOf({ machine, connectors }), [machine, connectors]);
  const known = useMemo(
    () => ({ families: machine.families.map(({ name }) => name), rails: machine.rails.map(({ name }) => name) }),
    [machine],
  );
  const { store, state } = usePinStore(kept, shelf);
  const table = useChosen(view, state, known);
  const saving = useSavePins(shelf.project, store, save, known);
  const scroller = useRef<HTMLDivElement>(null);

  const toCheck = useMemo(() => pinsToCheck(kept, state, known), [kept, state, known]);
  const check = useMachineCheck(machine, toCheck);
  const findings = useMemo(() => shownFindings(check, view.findings), [check, view.findings]);
  const weightAt = useMemo(() => weightsByPin(findings), [findings]);
  const netAt = useMemo(() => netsByPin(check?.nets ?? []), [check]);

  const grid = usePinGrid({
    table: table.table,
    store,
    known,
    isReadOnly,
    page: () => Math.floor((scroller.current?.clientHeight ?? 640) / 34) - 1,
    start: Math.max(0, startPin === undefined ? 0 : (table.table.rowNamed(startPin) ?? 0)),
    onStep: ([first]) => first && goTo(first, placeOf(first.column)),
  });

  function goTo({ connectorId, pin }: PinKey, place = placeOf("signal")) {
    const target = connectors.find(({ id }) => id === connectorId);
    if (!target) return;
    const isShown = table.isAll || table.chosen?.id === connectorId;
    const rows = isShown ? table.rows : table.rowsOf(connectorId);
    const row = rows.findIndex((one) => one.connectorId === connectorId && one.pin === pin);
    if (!isShown) void table.setAddress(addressOf(target));
    grid.go(at(Math.max(0, row), place));
    focusCell(scroller, Math.max(0, row), place);
  }

  function doWhatItSays({ edits, title }: ShownFinding) {
    const changes = changesOfEdits(edits, (id, pin) => shownTexts(state.kept, state.drafts, id, pin));
    const [first] = changes;
    if (!first) return grid.say("The pins say so already.");
    store.apply(changes, grid.selection);
    goTo(first, placeOf(first.column));
    grid.say(`${title}: mended in ${changes.length === 1 ? "one cell" : `${changes.length} cells`}, not saved yet.`);
  }

  const problems = Object.keys(state.drafts).flatMap((id) =>
    table.rowsOf(id).filter((row) => row.isChanged && Object.keys(row.problems).length > 0),
  );
  const blocked = conflictsOf(state);

  async function saveAll() {
    const { drafts } = store.read();
    const ids = Object.keys(drafts).filter((id) => state.kept[id] !== undefined && !blocked.includes(id));
    const [first] = problems;
    if (first) {
      goTo(first, placeOf(firstColumn(first)));
      return grid.say(
        `${problems.length === 1 ? "One row needs" : `${problems.length} rows need`} another look before they can be saved.`,
        true,
      );
    }
    if (ids.length === 0 || saving.isSaving) return;
    const saved = await saving.saveAll(ids);
    if (saved === 0) return;
    toast({ text: saved === 1 ? "One pin is saved." : `${saved} pins are saved.` });
    // Only after an answer: without network the page would be left for one that cannot come.
    router.refresh();
  }

  // Whoever came by a link to a pin wants to be at it.
  const startRow = useRef(startPin === undefined ? undefined : grid.selection.focus.row);
  useEffect(() => {
    if (startRow.current !== undefined) focusCell(scroller, startRow.current, placeOf("signal"));
  }, []);

  useSaveKey(() => void saveAll(), !isReadOnly);

  const [hovered, setHovered] = useState<string>();
  const focused = table.rows[grid.selection.focus.row];
  const lit: PinKey | undefined =
    hovered !== undefined && table.chosen ? { connectorId: table.chosen.id, pin: hovered } : focused;
  const [placement, setPlacement] = useState<string>();
  const codeOf = (connectorId: string) => connectors.find(({ id }) => id === connectorId)?.code;
  const placementsOf = (connectorId: string) => machine.placements.filter(({ board }) => board === codeOf(connectorId));
  const placed = (connectorId: string) => {
    const all = placementsOf(connectorId);
    return (all.find(({ id }) => id === placement) ?? all[0])?.id;
  };
  const netOf = (key: PinKey | undefined) => {
    const at = key && placed(key.connectorId);
    return key && at !== undefined ? netAt({ placement: at, ...key }) : undefined;
  };

  return {
    ...{ store, state, grid, scroller, check, findings, known, saving, problems, blocked, isReadOnly },
    ...{ table, goTo, doWhatItSays, saveAll, setHovered, focused, lit, placementsOf, placed, setPlacement, netOf },
    weightOf: (row: PinKey) => weightAt(row.connectorId, row.pin),
    roles: rolesOf(table.rows, known.rails),
    unsaved: changedPins(state.drafts),
  };
}

const firstColumn = ({ problems }: RowView) => PIN_COLUMNS.find((column) => problems[column] !== undefined) ?? "signal";

function rolesOf(rows: readonly RowView[], rails: readonly string[]): Record<string, PinRole> {
  return Object.fromEntries(
    rows
      .filter(({ texts }) => !isEmptyRow(texts))
      .map(({ pin, texts }) => [pin, readRole(texts.role) ?? impliedRole(texts.signal, rails)]),
  );
}
