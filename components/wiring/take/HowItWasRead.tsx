"use client";

import { Checkbox } from "@/components/ui/Checkbox";
import { Panel } from "@/components/ui/Panel";
import { Select } from "@/components/ui/Select";
import { FILE_COLUMNS, type FileColumn, type Mapping } from "@/lib/pin-map-file/guess-columns";
import { DELIMITERS, type Delimiter } from "@/lib/pin-map-file/split-table";
import { COLUMN_NAMES } from "@/lib/pin-map/pin-columns";
import type { TakeRead, TakeState } from "./use-take-state";

const SHOWN = 5;
const LEFT_OUT = "out";
const NAMES: Record<FileColumn, string> = { board: "Board", connector: "Connector", pin: "Pin", ...COLUMN_NAMES };
const COLUMN_OPTIONS = [{ id: LEFT_OUT, label: "Left out" }, ...FILE_COLUMNS.map((id) => ({ id, label: NAMES[id] }))];
const SEPARATORS: Record<Delimiter, string> = { tab: "Tab", semicolon: "Semicolon", comma: "Comma" };
// Object.keys() gives the very keys of the record; the compiler widens them to string.
const DELIMITER_IDS = Object.keys(DELIMITERS) as Delimiter[];

type Props = { file: { name: string; encoding: string }; read: TakeRead; correct: TakeState["correct"] };

/** The first rows as they were understood; a person corrects the separator, the headings and each column. */
export function HowItWasRead({ file, read, correct }: Props) {
  const { table, hasHeadings, mapping } = read;
  const rows = (hasHeadings ? table.rows.slice(1) : table.rows).slice(0, SHOWN);
  const headings = hasHeadings ? (table.rows[0]?.cells ?? []) : [];
  return (
    <Panel title="How it was read" note={`${file.name}, ${file.encoding}`}>
      <div className="flex flex-wrap items-end gap-x-6 gap-y-2">
        <Select
          label="Separator"
          className="w-40"
          options={DELIMITER_IDS.map((id) => ({ id, label: SEPARATORS[id] }))}
          value={table.delimiter}
          onChange={(id) =>
            correct({ delimiter: DELIMITER_IDS.find((one) => one === id) ?? "comma", ...NOTHING_KNOWN })
          }
        />
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
        className="relative -mx-4 mt-4 overflow-x-auto px-4 pb-1 sm:-mx-5 sm:px-5"
      >
        <table className="border-collapse text-left text-sm">
          <thead>
            <tr>
              <th scope="col" className="pr-3 align-bottom font-semibold text-ink-soft">
                <span className="sr-only">Line</span>
              </th>
              {mapping.map((column, at) => (
                <th key={at} scope="col" className="min-w-36 max-w-56 pb-2 pr-2 align-bottom font-normal">
                  <span className="mono block truncate pb-1 text-xs text-ink-soft">
                    {headings[at] ?? `column ${at + 1}`}
                  </span>
                  <Select
                    label={`What ${headings[at] ?? `column ${at + 1}`} is`}
                    isLabelHidden
                    options={COLUMN_OPTIONS}
                    value={column === "" ? LEFT_OUT : column}
                    onChange={(id) => correct({ mapping: withColumn(mapping, at, id) })}
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
    </Panel>
  );
}

/** Another separator makes another table: what was corrected of the old one goes. */
const NOTHING_KNOWN = { hasHeadings: undefined, mapping: undefined };

/** A column has one meaning, and a meaning one column: what had it before is left out. */
function withColumn(mapping: Mapping, at: number, id: string): Mapping {
  const wanted = FILE_COLUMNS.find((column) => column === id) ?? "";
  return mapping.map((column, other) => (other === at ? wanted : column === wanted ? "" : column));
}
