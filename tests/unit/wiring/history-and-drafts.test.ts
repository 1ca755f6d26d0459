import fc from "fast-check";
import { describe, expect, test } from "vitest";
import {
  afterSave,
  applyChanges,
  changedPins,
  rebased,
  rowsToSave,
  shownTexts,
  typedSince,
  type Drafts,
  type KeptMap,
} from "@/components/wiring/draft/pin-drafts";
import { addStep, NO_HISTORY, redoStep, undoStep } from "@/components/wiring/grid/history";
import { at } from "@/components/wiring/grid/selection";
import type { CellChange } from "@/components/wiring/grid/table-text";
import { EMPTY_TEXTS, PIN_COLUMNS, type PinColumn } from "@/lib/pin-map/pin-columns";

const kept: KeptMap = {
  J1: { version: 3, rows: { a1: { ...EMPTY_TEXTS, signal: "GND", role: "ground" } } },
  J2: { version: 1, rows: {} },
};
const write = (
  drafts: Drafts,
  pin: string,
  after: string,
  column: PinColumn = "signal",
  connectorId = "J1",
): CellChange => ({
  connectorId,
  pin,
  column,
  before: shownTexts(kept, drafts, connectorId, pin)[column],
  after,
});

describe("what was typed and not saved", () => {
  test("is laid over what is kept, for several connectors, and counted by pin", () => {
    let drafts = applyChanges({}, kept, [
      write({}, "a1", "0V"),
      write({}, "a2", "CLK"),
      write({}, "a2", "input", "role"),
    ]);
    drafts = applyChanges(drafts, kept, [write(drafts, "1", "CLK", "signal", "J2")]);
    expect(shownTexts(kept, drafts, "J1", "a1")).toMatchObject({ signal: "0V", role: "ground" });
    expect(changedPins(drafts)).toBe(3);
    expect(rowsToSave(kept, drafts, "J1")).toEqual([
      { pin: "a1", ...EMPTY_TEXTS, signal: "0V", role: "ground" },
      { pin: "a2", ...EMPTY_TEXTS, signal: "CLK", role: "input" },
    ]);
  });

  test("is no change any more when it is as the server has it", () => {
    const drafts = applyChanges({}, kept, [write({}, "a1", "0V")]);
    expect(applyChanges(drafts, kept, [write(drafts, "a1", "GND")])).toEqual({});
  });

  test("stays after a save that began before it, and a role that was left empty does not come back as a change", () => {
    const first = applyChanges({}, kept, [write({}, "a1", "", "role")]);
    const sent = rowsToSave(kept, first, "J1").map(({ pin, ...typed }) => ({
      pin,
      typed,
      stored: { ...typed, role: "ground" },
    }));
    const second = applyChanges(first, kept, [write(first, "a2", "CLK")]);
    const now = afterSave(kept, "J1", 4, sent);
    const draft = second.J1 && rebased(typedSince(second.J1, sent), now.J1 ?? { version: 0, rows: {} });
    expect(now.J1?.rows.a1).toMatchObject({ signal: "GND", role: "ground" });
    expect(draft).toMatchObject({ version: 4, pins: { a2: { typed: { signal: "CLK" } } } });
    expect(Object.keys(draft?.pins ?? {})).toEqual(["a2"]);
  });

  test("is laid over another person's version cell by cell, and only where it differs", () => {
    const drafts = applyChanges({}, kept, [write({}, "a1", "0V"), write({}, "a2", "CLK")]);
    const theirs = {
      version: 9,
      rows: { a1: { ...EMPTY_TEXTS, signal: "0V" }, a2: { ...EMPTY_TEXTS, role: "input" } },
    };
    expect(drafts.J1 && rebased(drafts.J1, theirs)).toEqual({
      version: 9,
      pins: { a2: { typed: { signal: "CLK" }, was: theirs.rows.a2 } },
    });
  });
});

describe("undo and redo", () => {
  test("take any run of edits back to where it began, and forth to where it ended", () => {
    const edit = fc.record({
      pin: fc.constantFrom("a1", "a2", "a3"),
      column: fc.constantFrom(...PIN_COLUMNS),
      after: fc.constantFrom("", "GND", "CLK"),
    });
    fc.assert(
      fc.property(fc.array(edit, { maxLength: 30 }), (edits) => {
        let drafts: Drafts = {};
        let history = NO_HISTORY;
        for (const { pin, column, after } of edits) {
          const changes = [write(drafts, pin, after, column)];
          drafts = applyChanges(drafts, kept, changes);
          history = addStep(history, { changes, selection: at(0, 1) });
        }
        const ended = drafts;
        for (let undone = undoStep(history); undone; undone = undoStep(history)) {
          drafts = applyChanges(drafts, kept, undone.step.changes);
          history = undone.history;
        }
        expect(drafts).toEqual({});
        for (let redone = redoStep(history); redone; redone = redoStep(history)) {
          drafts = applyChanges(drafts, kept, redone.step.changes);
          history = redone.history;
        }
        expect(drafts).toEqual(ended);
      }),
    );
  });

  test("end with a new edit: what was undone is gone then", () => {
    const step = { changes: [], selection: at(0, 1) };
    const undone = undoStep(addStep(NO_HISTORY, step));
    expect(redoStep(undone?.history ?? NO_HISTORY)).toBeDefined();
    expect(redoStep(addStep(undone?.history ?? NO_HISTORY, step))).toBeUndefined();
    expect(undoStep(NO_HISTORY)).toBeUndefined();
  });
});
