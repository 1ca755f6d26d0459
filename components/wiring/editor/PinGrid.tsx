"use client";

import { useVirtualizer, type Range } from "@tanstack/react-virtual";
import clsx from "clsx";
import { useId, useMemo, type RefObject } from "react";
import type { Weight } from "@/lib/calc/interconnect";
import { areaOf, isInArea } from "../grid/selection";
import type { Words } from "../grid/suggest";
import { columnAt, headingAt, type TableText } from "../grid/table-text";
import { CellEditor } from "./CellEditor";
import { drawnColumns, shapeOf } from "./grid-columns";
import { GridHead, HEAD_HEIGHT } from "./GridHead";
import { GridRow } from "./GridRow";
import type { RowView } from "./row-views";
import { useGridFocus } from "./use-grid-focus";
import { useGridPointer } from "./use-grid-pointer";
import type { usePinGrid } from "./use-pin-grid";

const ROW = 34;
/** Rows drawn before the browser says how much room there is. */
const FIRST_HEIGHT = 640;

type Props = {
  label: string;
  grid: ReturnType<typeof usePinGrid>;
  rows: readonly RowView[];
  table: TableText;
  words: Words;
  rails: readonly string[];
  isReadOnly: boolean;
  hasSeveral: boolean;
  weightOf: (row: RowView) => Weight | undefined;
  driversOf: (row: RowView) => string;
  scroller: RefObject<HTMLDivElement | null>;
  className?: string;
};

/** The table of pins: only the rows in sight are drawn, and one cell of all takes the keyboard. */
export function PinGrid(props: Props) {
  const { label, grid, rows, table, words, rails, isReadOnly, hasSeveral, scroller } = props;
  const { selection, editing, said } = grid;
  const { focus } = selection;
  const area = areaOf(selection);
  const noteId = useId();
  const { columns, shape } = useMemo(() => {
    const drawn = drawnColumns(hasSeveral ? 9 : 4.25);
    return { columns: drawn, shape: shapeOf(drawn) };
  }, [hasSeveral]);
  const isTyping = editing !== undefined;
  const { hold, ...focusing } = useGridFocus(scroller, focus, isTyping);
  const pointing = useGridPointer(grid, hold);

  // eslint-disable-next-line react-hooks/incompatible-library -- its functions are used in this render only
  const virtualizer = useVirtualizer({
    count: rows.length,
    getScrollElement: () => scroller.current,
    estimateSize: () => ROW,
    overscan: 12,
    initialRect: { width: 0, height: FIRST_HEIGHT },
    // The row one is in stays drawn wherever one scrolls, so that the keyboard never loses its cell.
    rangeExtractor: (range) => rangeWith(range, focus.row),
  });
  const middle = (virtualizer.scrollOffset ?? 0) + (virtualizer.scrollRect?.height ?? FIRST_HEIGHT) / 2;

  /** What only the row has that one is in: the field, and the sentence beside the cell. */
  function activeParts(row: RowView, index: number, top: number) {
    const column = columnAt(focus.column);
    const opens = top + HEAD_HEIGHT > middle ? ("up" as const) : ("down" as const);
    const refusal = said?.isRefusal ? said.text : undefined;
    const text = isTyping ? refusal : row.problems[column ?? "pin"];
    return {
      active: focus.column,
      note: text === undefined ? undefined : { id: noteId, text, opens },
      editor: editing && column && (
        <CellEditor
          key={`${focus.row} ${focus.column}`}
          label={`${table.labelAt(index)}, ${headingAt(focus.column)}`}
          describedBy={text === undefined ? undefined : noteId}
          onCommit={grid.commit}
          onKeep={grid.keep}
          onCancel={grid.cancel}
          {...{ column, editing, words, opens }}
        />
      ),
    };
  }

  return (
    <div
      ref={scroller}
      role="grid"
      aria-label={label}
      aria-rowcount={rows.length + 1}
      aria-colcount={columns.length}
      aria-multiselectable="true"
      aria-readonly={isReadOnly}
      onKeyDown={grid.onKeyDown}
      onCopy={(event) => grid.onCopy(event)}
      onCut={(event) => grid.onCopy(event, true)}
      onPaste={grid.onPaste}
      {...focusing}
      {...pointing}
      className={clsx(
        "relative select-none overflow-auto overscroll-contain outline-none [scroll-padding:2.5rem_1rem_1rem_5rem]",
        props.className,
      )}
    >
      <GridHead columns={columns} shape={shape} />
      <div role="presentation" className="relative" style={{ width: shape.width, height: virtualizer.getTotalSize() }}>
        {virtualizer.getVirtualItems().map(({ index, start }) => {
          const row = rows[index];
          if (!row) return null;
          const isChosen = isInArea(area, index, area.left);
          return (
            <GridRow
              key={`${row.connectorId} ${row.pin}`}
              label={table.labelAt(index)}
              height={ROW}
              top={start}
              chosenFrom={isChosen ? area.left : -1}
              chosenTo={isChosen ? area.right : -1}
              weight={props.weightOf(row)}
              drivers={props.driversOf(row)}
              {...{ row, index, columns, shape, rails, isReadOnly }}
              {...(index === focus.row ? activeParts(row, index, start) : {})}
            />
          );
        })}
      </div>
    </div>
  );
}

function rangeWith({ startIndex, endIndex, overscan, count }: Range, row: number): number[] {
  const from = Math.max(0, startIndex - overscan);
  const to = Math.min(count - 1, endIndex + overscan);
  const indexes = Array.from({ length: Math.max(0, to - from + 1) }, (_, index) => from + index);
  if (row < from && row >= 0) return [row, ...indexes];
  return row > to && row < count ? [...indexes, row] : indexes;
}
