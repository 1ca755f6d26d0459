"use client";

import { useVirtualizer, type Range } from "@tanstack/react-virtual";
import clsx from "clsx";
import { useId, useLayoutEffect, useRef, type PointerEvent, type RefObject } from "react";
import type { Weight } from "@/lib/calc/interconnect";
import { areaOf, at, isInArea, moveTo } from "../grid/selection";
import type { Words } from "../grid/suggest";
import { columnAt, headingAt, type TableText } from "../grid/table-text";
import { CellEditor } from "./CellEditor";
import { drawnColumns, templateOf } from "./grid-columns";
import { GridRow } from "./GridRow";
import type { RowView } from "./row-views";
import type { usePinGrid } from "./use-pin-grid";

const ROW = 34;
const HEAD = 36;
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
  const isDragging = useRef(false);
  const columns = drawnColumns(hasSeveral ? "9rem" : "4.25rem");
  const template = templateOf(columns);

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

  const isTyping = editing !== undefined;
  useLayoutEffect(() => {
    const cell = scroller.current?.querySelector<HTMLElement>(
      `[data-row="${focus.row}"][data-place="${focus.column}"]`,
    );
    if (!cell) return;
    const held = document.activeElement;
    const isHere = held === document.body || scroller.current?.contains(held);
    if (isHere && scroller.current?.dataset.held === "true") {
      if (!isTyping) cell.focus({ preventScroll: true });
      cell.scrollIntoView({ block: "nearest", inline: "nearest" });
    }
  }, [focus.row, focus.column, isTyping, scroller]);

  function pointed(event: PointerEvent) {
    const cell = event.target instanceof Element ? event.target.closest<HTMLElement>("[data-place]") : null;
    const { row, place } = cell?.dataset ?? {};
    return row === undefined || place === undefined ? undefined : { row: Number(row), column: Number(place) };
  }

  function onPointerDown(event: PointerEvent) {
    if (event.target instanceof HTMLInputElement || event.button !== 0) return;
    const place = pointed(event);
    if (!place) return;
    hold(true);
    const isSame = place.row === focus.row && place.column === focus.column;
    if (isSame && !event.shiftKey && event.pointerType === "touch") return grid.begin(undefined);
    isDragging.current = event.pointerType === "mouse";
    grid.go(event.shiftKey ? moveTo(selection, place, grid.size, true) : at(place.row, place.column));
  }

  function onPointerMove(event: PointerEvent) {
    if (!isDragging.current || event.buttons !== 1) return;
    const place = pointed(event);
    if (place && (place.row !== focus.row || place.column !== focus.column)) {
      grid.go(moveTo(selection, place, grid.size, true));
    }
  }

  /** Whether the table has the keyboard: only then does it draw the focus to its cell. */
  function hold(isHeld: boolean) {
    if (scroller.current) scroller.current.dataset.held = String(isHeld);
  }

  const middle = (scroller.current?.scrollTop ?? 0) + (scroller.current?.clientHeight ?? FIRST_HEIGHT) / 2;
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
      onFocus={() => hold(true)}
      onBlur={(event) => {
        const { relatedTarget } = event;
        // A field that goes away takes the focus with it and leaves nothing in its place: the table keeps the keyboard.
        if (relatedTarget !== null && !event.currentTarget.contains(relatedTarget)) hold(false);
      }}
      onPointerDown={onPointerDown}
      onPointerMove={onPointerMove}
      onPointerUp={() => (isDragging.current = false)}
      onDoubleClick={(event) => {
        if (!(event.target instanceof HTMLInputElement)) grid.begin(undefined);
      }}
      className={clsx(
        "relative overflow-auto overscroll-contain outline-none [scroll-padding:2.5rem_1rem_1rem_5rem]",
        props.className,
      )}
    >
      <div
        role="row"
        aria-rowindex={1}
        className="sticky top-0 z-[5] grid w-max min-w-full border-b border-rule-strong bg-sheet"
        style={{ gridTemplateColumns: template, height: HEAD }}
      >
        {columns.map(({ id, heading }, index) => (
          <div
            key={id}
            role="columnheader"
            aria-colindex={index + 1}
            className={clsx(
              "flex items-center bg-sheet px-2 text-xs font-semibold text-ink-soft",
              id === "pin" && "sticky left-0 z-[1]",
              (id === "loads" || id === "pullUpOhm") && "justify-end",
            )}
          >
            {heading}
          </div>
        ))}
      </div>
      <div role="presentation" className="relative w-max min-w-full" style={{ height: virtualizer.getTotalSize() }}>
        <div
          aria-hidden="true"
          className="invisible grid h-0 overflow-hidden"
          style={{ gridTemplateColumns: template }}
        >
          {columns.map(({ id }) => (
            <span key={id} />
          ))}
        </div>
        {virtualizer.getVirtualItems().map(({ index, start }) => {
          const row = rows[index];
          if (!row) return null;
          const isRowActive = index === focus.row;
          const column = isRowActive ? columnAt(focus.column) : undefined;
          const opens = start + HEAD > middle ? "up" : "down";
          const problem = isRowActive ? row.problems[column ?? "pin"] : undefined;
          const text = said?.isRefusal && isTyping ? said.text : isTyping ? undefined : problem;
          return (
            <GridRow
              key={`${row.connectorId} ${row.pin}`}
              row={row}
              index={index}
              label={table.labelAt(index)}
              columns={columns}
              template={template}
              height={ROW}
              top={start}
              chosen={isInArea(area, index, area.left) ? { from: area.left, to: area.right } : undefined}
              active={isRowActive ? focus.column : undefined}
              weight={props.weightOf(row)}
              drivers={props.driversOf(row)}
              rails={rails}
              isReadOnly={isReadOnly}
              note={isRowActive && text ? { id: noteId, text, opens } : undefined}
              editor={
                isRowActive && editing && column ? (
                  <CellEditor
                    key={`${focus.row} ${focus.column}`}
                    label={`${table.labelAt(index)}, ${headingAt(focus.column)}`}
                    column={column}
                    editing={editing}
                    words={words}
                    opens={opens}
                    describedBy={text ? noteId : undefined}
                    onCommit={grid.commit}
                    onKeep={grid.keep}
                    onCancel={grid.cancel}
                  />
                ) : undefined
              }
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
