"use client";

import type { ReactNode } from "react";
import { Checkbox } from "@/components/ui/Checkbox";
import { Select } from "@/components/ui/Select";
import { DELIMITERS, type Delimiter, type Table } from "@/lib/pin-map-file/split-table";

const SHOWN = 5;
const LEFT_OUT = "out";
const SEPARATORS: Record<Delimiter, string> = { tab: "Tab", semicolon: "Semicolon", comma: "Comma" };
// Object.keys() gives the very keys of the record; the compiler widens them to string.
const DELIMITER_IDS = Object.keys(DELIMITERS) as Delimiter[];

type Corrections<Column extends string> = {
  delimiter?: Delimiter;
  hasHeadings?: boolean | undefined;
  mapping?: (Column | "")[] | undefined;
};

type Props<Column extends string> = {
  table: Table;
  hasHeadings: boolean;
  /** What each column of the file is; "": left out. */
  mapping: readonly (Column | "")[];
  names: Record<Column, string>;
  correct: (change: Corrections<Column>) => void;
  /** More to correct of this kind of file. */
  children?: ReactNode;
};

/** The first rows as they were understood; a person corrects the separator, the headings and each column. */
export function ColumnTable<Column extends string>(props: Props<Column>) {
  const { table, hasHeadings, mapping, names, correct, children } = props;
  // Object.keys() gives the very keys of the record; the compiler widens them to string.
  const columns = Object.keys(names) as Column[];
  const options = [{ id: LEFT_OUT, label: "Left out" }, ...columns.map((id) => ({ id, label: names[id] }))];
  const rows = (hasHeadings ? table.rows.slice(1) : table.rows).slice(0, SHOWN);
  const headings = hasHeadings ? (table.rows[0]?.cells ?? []) : [];
  const headingOf = (at: number) => headings[at] ?? `column ${at + 1}`;

  /** A column has one meaning, and a meaning one column: what had it before is left out. */
  const withColumn = (at: number, id: string) => {
    const wanted = columns.find((column) => column === id) ?? "";
    return mapping.map((column, other) => (other === at ? wanted : column === wanted ? "" : column));
  };

  return (
    <div className="flex flex-col gap-4">
      <div className="flex flex-wrap items-end gap-x-6 gap-y-2">
        <Select
          label="Separator"
          className="w-40"
          options={DELIMITER_IDS.map((id) => ({ id, label: SEPARATORS[id] }))}
          value={table.delimiter}
          onChange={(id) =>
            // Another separator makes another table: what was corrected of the old one goes.
            correct({
              delimiter: DELIMITER_IDS.find((one) => one === id) ?? "comma",
              hasHeadings: undefined,
              mapping: undefined,
            })
          }
        />
        {children}
        <Checkbox
          label="The first row names the columns"
          value={hasHeadings}
          onChange={(isOn) => correct({ hasHeadings: isOn })}
        />
      </div>
      <div
        tabIndex={0}
        role="group"
        aria-label="First rows of the file, scrolls sideways"
        className="relative -mx-4 overflow-x-auto px-4 pb-1 sm:-mx-5 sm:px-5"
      >
        <table className="border-collapse text-left text-sm">
          <thead>
            <tr>
              <th scope="col" className="pr-3 align-bottom font-semibold text-ink-soft">
                <span className="sr-only">Line</span>
              </th>
              {mapping.map((column, at) => (
                <th key={at} scope="col" className="min-w-36 max-w-56 pb-2 pr-2 align-bottom font-normal">
                  <span className="mono block truncate pb-1 text-xs text-ink-soft">{headingOf(at)}</span>
                  <Select
                    label={`What ${headingOf(at)} is`}
                    isLabelHidden
                    options={options}
                    value={column === "" ? LEFT_OUT : column}
                    onChange={(id) => correct({ mapping: withColumn(at, id) })}
                  />
                </th>
              ))}
            </tr>
          </thead>
          <tbody>
            {rows.map(({ line, cells }) => (
              <tr key={line} className="border-t border-rule">
                <th scope="row" className="mono py-1.5 pr-3 text-right text-xs font-normal text-ink-soft">
                  {line}
                </th>
                {mapping.map((column, at) => (
                  <td
                    key={at}
                    className={`mono max-w-56 truncate py-1.5 pr-3 text-xs ${column === "" ? "text-ink-faint" : ""}`}
                  >
                    {cells[at] ?? ""}
                  </td>
                ))}
              </tr>
            ))}
          </tbody>
        </table>
      </div>
    </div>
  );
}
