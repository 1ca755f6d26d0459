import clsx from "clsx";
import { useId, type ReactNode } from "react";
import type { Weight } from "@/lib/calc/interconnect";
import { isEmptyRow } from "@/lib/pin-map/pin-columns";
import { impliedRole, readRole } from "@/lib/pin-map/pin-role";
import { RoleSwatch } from "../beside/RoleLegend";
import { WEIGHT_WORDS, WeightMark } from "../WeightMark";
import type { RowView } from "./row-views";

type Props = {
  name: string;
  rows: readonly RowView[];
  labelAt: (index: number) => string;
  /** The row one is at. */
  at: number;
  rails: readonly string[];
  weightOf: (row: RowView) => Weight | undefined;
  driversOf: (row: RowView) => string;
  onPick: (index: number) => void;
  /** Of the pin one is at. */
  detail: ReactNode;
};

/** The pins for reading on a phone: what each carries; the empty ones in one line. */
export function PinList({ name, rows, labelAt, at, rails, weightOf, driversOf, onPick, detail }: Props) {
  const id = useId();
  const carrying = rows.map((row, index) => ({ row, index })).filter(({ row }) => !isEmptyRow(row.texts));
  const bare = rows.length - carrying.length;
  return (
    <div>
      <ul aria-label={`Pins of ${name}`} className="divide-y divide-rule border-y border-rule">
        {carrying.map(({ row, index }) => {
          const { signal, family, pullUpOhm, role: typed, note } = row.texts;
          const role = readRole(typed) ?? impliedRole(signal, rails);
          const weight = weightOf(row);
          const more = [family, pullUpOhm === "" ? "" : `pull-up ${pullUpOhm}`, driversOf(row), note].filter(
            (text) => text !== "",
          );
          return (
            <li key={`${row.connectorId} ${row.pin}`}>
              <button
                type="button"
                onClick={() => onPick(index)}
                data-list-row={index}
                aria-expanded={index === at}
                className={clsx(
                  "grid min-h-12 w-full grid-cols-[3.25rem_minmax(0,1fr)_auto] items-center gap-x-2 px-1 py-2 text-left",
                  index === at && "bg-copper-ground",
                )}
              >
                <span className="mono text-sm font-semibold">{labelAt(index)}</span>
                <span className="min-w-0">
                  <span className="mono block truncate font-semibold">{signal === "" ? "no signal" : signal}</span>
                  <span className="block truncate text-sm text-ink-soft">{[role, ...more].join(" · ")}</span>
                </span>
                <span className="flex items-center gap-2">
                  {weight && (
                    <>
                      <WeightMark weight={weight} size={14} />
                      <span className="sr-only">{WEIGHT_WORDS[weight]}</span>
                    </>
                  )}
                  <RoleSwatch role={role} id={`${id}-${index}`} />
                </span>
              </button>
              {index === at && <div className="px-1 pb-4 pt-2">{detail}</div>}
            </li>
          );
        })}
      </ul>
      {bare > 0 && (
        <p className="pt-3 text-sm text-ink-soft">
          {bare === 1 ? "One pin carries" : `${bare} pins carry`} nothing. Pins are edited on a wider screen.
        </p>
      )}
    </div>
  );
}
