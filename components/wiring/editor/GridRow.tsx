"use client";

import clsx from "clsx";
import { memo, type ReactNode } from "react";
import type { Weight } from "@/lib/calc/interconnect";
import type { PinColumn } from "@/lib/pin-map/pin-columns";
import { impliedRole } from "@/lib/pin-map/pin-role";
import { WEIGHT_WORDS, WeightMark } from "../WeightMark";
import type { DrawnColumn, RowShape } from "./grid-columns";
import type { RowView } from "./row-views";

export type RowProps = {
  row: RowView;
  index: number;
  label: string;
  columns: readonly DrawnColumn[];
  shape: RowShape;
  height: number;
  top: number;
  /** Chosen columns of this row, as places; −1 when there are none. */
  chosenFrom: number;
  chosenTo: number;
  /** The place one is in, when one is in this row. */
  active?: number | undefined;
  weight: Weight | undefined;
  drivers: string;
  rails: readonly string[];
  isReadOnly: boolean;
  /** The field, while this row's active cell is typed into. */
  editor?: ReactNode;
  /** The sentence beside the active cell, and its id. */
  note?: { id: string; text: string; opens: "down" | "up" } | undefined;
};

const MONO: readonly string[] = ["pin", "signal", "family", "loads", "enableGroup", "pullUpOhm", "net"];

/** One row of the table. Drawn anew only when something in it changed. */
export const GridRow = memo(function GridRow(props: RowProps) {
  const { row, index, columns, shape, height, top, active } = props;
  return (
    <div
      role="row"
      aria-rowindex={index + 2}
      className={clsx(
        "absolute left-0 grid border-b border-rule",
        active !== undefined && "z-[2]",
        active !== undefined ? "bg-copper-ground/45" : "bg-sheet",
      )}
      style={{ ...shape, height, transform: `translateY(${top}px)` }}
    >
      {columns.map((column, at) => (
        <Cell key={column.id} {...props} column={column} colIndex={at + 1} isChanged={row.isChanged} />
      ))}
    </div>
  );
});

type CellProps = RowProps & { column: DrawnColumn; colIndex: number; isChanged: boolean };

function Cell(props: CellProps) {
  const { row, index, column, colIndex, active, editor, note } = props;
  const { id, place } = column;
  const isActive = place !== undefined && place === active;
  const isChosen = place !== undefined && place >= props.chosenFrom && place <= props.chosenTo;
  const problem = id === "net" ? undefined : row.problems[id];
  return (
    <div
      role={id === "pin" ? "rowheader" : "gridcell"}
      aria-colindex={colIndex}
      aria-selected={place === undefined ? undefined : isChosen}
      aria-readonly={props.isReadOnly || id === "pin" || id === "net" ? true : undefined}
      aria-invalid={problem ? true : undefined}
      aria-describedby={isActive && note && !editor ? note.id : undefined}
      tabIndex={place === undefined ? undefined : isActive ? 0 : -1}
      data-row={place === undefined ? undefined : index}
      data-place={place}
      className={clsx(
        "relative flex min-w-0 scroll-mx-4 scroll-mt-10 items-center border-r border-rule/50 px-2 text-sm last:border-r-0",
        MONO.includes(id) && "mono",
        id === "pin" && "sticky left-0 z-[1] gap-1.5 font-semibold",
        id === "pin" && (active !== undefined ? "bg-copper-ground" : "bg-sheet"),
        id === "net" && "text-ink-soft",
        (id === "loads" || id === "pullUpOhm") && "justify-end",
        isChosen && !isActive && "bg-copper-ground!",
        problem && "bg-failed-ground! text-failed",
        isActive && "outline-2! outline-solid! -outline-offset-2! outline-copper! focus:outline-[3px]!",
      )}
    >
      {id === "pin" && props.isChanged && (
        <i aria-hidden="true" className="absolute inset-y-0 left-0 w-[3px] bg-copper" />
      )}
      <Content {...props} />
      {problem && (
        <i
          aria-hidden="true"
          className="absolute right-0 top-0 border-4 border-b-transparent border-l-transparent border-r-failed border-t-failed"
        />
      )}
      {isActive && editor}
      {isActive && note && (
        <span
          id={note.id}
          className={clsx(
            "absolute left-0 z-40 w-max max-w-80 rounded border border-failed bg-failed-ground px-2 py-1 font-text text-xs font-medium leading-snug text-ink shadow-float",
            note.opens === "down" ? "top-full mt-1" : "bottom-full mb-1",
          )}
        >
          {note.text}
        </span>
      )}
    </div>
  );
}

function Content({ row, column, label, weight, drivers, rails }: CellProps) {
  const { id } = column;
  if (id === "pin") {
    return (
      <>
        <span className={clsx("truncate", row.problems.pin && "text-failed")}>{label}</span>
        {weight && (
          <>
            <WeightMark weight={weight} size={11} />
            <span className="sr-only">{WEIGHT_WORDS[weight]}</span>
          </>
        )}
        {row.isChanged && <span className="sr-only">not saved</span>}
      </>
    );
  }
  if (id === "net") return <span className="truncate text-xs">{drivers}</span>;
  const text = row.texts[id satisfies PinColumn];
  if (text === "" && id === "role" && row.texts.signal !== "") {
    return <span className="truncate italic text-ink-faint">{impliedRole(row.texts.signal, rails)}</span>;
  }
  return <span className={clsx("truncate", id === "signal" && "font-semibold")}>{text}</span>;
}
