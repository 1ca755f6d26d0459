"use client";

import { useState, type ClipboardEvent, type KeyboardEvent } from "react";
import { readCell, type KnownNames } from "@/lib/pin-map/read-cell";
import type { PinStore } from "../draft/pin-store";
import { clearCells, copyCells, fillAll, fillDown, typeInto, type Planned } from "../grid/fill";
import { commandFor, pressedOf, type Command } from "../grid/key-commands";
import { pasteBlock } from "../grid/paste";
import { at, everything, moveTo, nextCell, type Place, type Selection, type Size } from "../grid/selection";
import {
  changeOf,
  PIN_PLACE,
  TABLE_COLUMNS,
  textAt,
  TYPED_PLACES,
  type CellChange,
  type TableText,
} from "../grid/table-text";
import { parseTsv, writeTsv } from "../grid/tsv";

/** The cell that is being typed into. `isFresh`: begun by a letter, so that arrows leave it as in a spreadsheet. */
export type Editing = { text: string; isFresh: boolean };
export type Said = { text: string; isRefusal: boolean };
/** After typing: down and up with Enter, along the row with the tabulator, or stay. */
export type Leaving = "down" | "up" | "next" | "previous" | "left" | "right" | "stay";

type Given = {
  table: TableText;
  store: PinStore;
  known: KnownNames;
  isReadOnly: boolean;
  /** The row to begin in. */
  start: number;
  /** Rows in sight. */
  page: () => number;
  onStep: (changes: readonly CellChange[]) => void;
};

/** Where one is in the table, what is being typed, and everything that keys and the clipboard do. */
export function usePinGrid({ table, store, known, isReadOnly, start, page, onStep }: Given) {
  const [selection, setSelection] = useState<Selection>(() => at(start, 1));
  const [editing, setEditing] = useState<Editing>();
  const [said, setSaid] = useState<Said>();
  const size: Size = { rows: table.rows.length, columns: TABLE_COLUMNS };

  /** Changes as they will stand: short forms written out, blanks at the ends gone. */
  function perform(planned: Planned): boolean {
    if (!planned.ok) {
      setSaid({ text: planned.sentence, isRefusal: true });
      return false;
    }
    const changes = planned.changes.flatMap((change): CellChange[] => {
      const read = readCell(change.column, change.after, known);
      const after = read.ok ? read.text : change.after.trim();
      return after === change.before ? [] : [{ ...change, after }];
    });
    store.apply(changes, selection);
    setSaid(planned.said === "" ? undefined : { text: planned.said, isRefusal: false });
    return true;
  }

  function go(next: Selection) {
    setSelection(next);
    setEditing(undefined);
    setSaid(undefined);
  }

  function begin(text: string | undefined) {
    const { row, column } = selection.focus;
    if (isReadOnly || column === PIN_PLACE || row >= size.rows) return;
    setSaid(undefined);
    setEditing({ text: text ?? textAt(table, row, column), isFresh: text !== undefined });
  }

  /** False when the text was refused: it stays in the cell with the sentence beside it. */
  function commit(text: string, leaving: Leaving, isForAll = false): boolean {
    const planned = isForAll ? fillAll(table, selection, text) : typeInto(table, selection, text);
    if (!perform(planned)) return false;
    leave(leaving);
    return true;
  }

  /** When one leaves the cell by pressing elsewhere, whatever was typed stays in it, also what cannot be read. */
  function keep(text: string) {
    if (!editing) return;
    const { row, column } = selection.focus;
    perform({ ok: true, changes: changeOf(table, row, column, text), said: "" });
    setEditing(undefined);
  }

  function leave(leaving: Leaving) {
    setEditing(undefined);
    const next = placeAfter(leaving, selection.focus, size);
    if (next) setSelection(moveTo(selection, next, size));
  }

  function follow(step: { changes: readonly CellChange[]; selection: Selection } | undefined, word: string) {
    if (!step) return setSaid({ text: `There is nothing to ${word}.`, isRefusal: true });
    setEditing(undefined);
    onStep(step.changes);
    setSaid({ text: word === "undo" ? "Undone." : "Done again.", isRefusal: false });
  }

  function run(command: Command, event: KeyboardEvent) {
    if (command.kind === "tab") {
      const next = nextCell(selection.focus, command.step, [PIN_PLACE, ...TYPED_PLACES], size.rows, false);
      // At the end of a row the tabulator leaves the table, so that nobody is caught in it.
      if (!next) return;
      event.preventDefault();
      return go(moveTo(selection, next, size));
    }
    event.preventDefault();
    if (command.kind === "move") return go(moveTo(selection, command.to, size, command.extend));
    if (command.kind === "all") return go(everything(size, selection.focus));
    if (command.kind === "one-cell") return go(at(selection.focus.row, selection.focus.column));
    if (command.kind === "edit") return begin(command.text);
    if (isReadOnly) return;
    if (command.kind === "clear") perform(clearCells(table, selection));
    if (command.kind === "fill-down") perform(fillDown(table, selection));
    if (command.kind === "undo") follow(store.undo(), "undo");
    if (command.kind === "redo") follow(store.redo(), "redo");
  }

  return {
    selection,
    editing,
    said,
    size,
    go,
    begin,
    commit,
    keep,
    say: (text: string, isRefusal = false) => setSaid({ text, isRefusal }),
    cancel: () => {
      setEditing(undefined);
      setSaid(undefined);
    },
    undo: () => follow(store.undo(), "undo"),
    redo: () => follow(store.redo(), "redo"),
    onKeyDown(event: KeyboardEvent) {
      if (editing || event.nativeEvent.isComposing) return;
      const command = commandFor(pressedOf(event), selection.focus, size, page());
      if (command) run(command, event);
    },
    onCopy(event: ClipboardEvent, isCut = false) {
      if (editing) return;
      event.preventDefault();
      event.clipboardData.setData("text/plain", writeTsv(copyCells(table, selection)));
      if (isCut && !isReadOnly) perform(clearCells(table, selection));
      else setSaid({ text: "Copied.", isRefusal: false });
    },
    onPaste(event: ClipboardEvent) {
      if (editing || isReadOnly) return;
      event.preventDefault();
      perform(pasteBlock(table, selection, parseTsv(event.clipboardData.getData("text/plain"))));
    },
  };
}

function placeAfter(leaving: Leaving, { row, column }: Place, size: Size): Place | undefined {
  if (leaving === "down") return { row: row + 1, column };
  if (leaving === "up") return { row: row - 1, column };
  if (leaving === "left") return { row, column: column - 1 };
  if (leaving === "right") return { row, column: column + 1 };
  if (leaving === "stay") return undefined;
  return nextCell({ row, column }, leaving === "next" ? 1 : -1, TYPED_PLACES, size.rows, true);
}
