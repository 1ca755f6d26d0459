"use client";

import { Notice } from "@/components/ui/Notice";
import { RadioGroup } from "@/components/ui/RadioGroup";
import { Select } from "@/components/ui/Select";
import { counted } from "@/components/workshop/counted";
import { Disclosure } from "@/components/workshop/Disclosure";
import { IPC_SCALES } from "@/lib/netlist/schema";
import { ColumnsOfList } from "./ColumnsOfList";
import { LineNotes } from "./LineNotes";
import { NetlistSummary } from "./NetlistSummary";
import type { Corrections, NetlistRead } from "./use-netlist-file";

const BY_HEADER = "header";

type Props = {
  loaded: { name: string; encoding: string };
  read: NetlistRead;
  correct: (change: Corrections) => void;
};

/** How a file was read, what of it counts for nothing, and the corrections. */
export function FilePreview({ loaded, read, correct }: Props) {
  const { result, table, source, scale } = read;
  return (
    <div className="flex flex-col gap-4 border-t border-rule pt-4">
      <div className="flex flex-wrap items-end gap-x-8 gap-y-3">
        <RadioGroup
          label="Read as"
          isInRow
          options={[
            { id: "ipc-d-356", label: "IPC-D-356" },
            { id: "pin-list", label: "List of pins" },
          ]}
          value={source}
          onChange={(id) => correct({ source: id === "pin-list" ? "pin-list" : "ipc-d-356" })}
        />
        {source === "ipc-d-356" && (
          <Select
            label="A unit of the coordinates is"
            className="w-56"
            options={[{ id: BY_HEADER, label: "as the header says" }, ...IPC_SCALES.map((id) => ({ id, label: id }))]}
            value={scale ?? BY_HEADER}
            onChange={(id) => correct({ scale: IPC_SCALES.find((one) => one === id) ?? null })}
          />
        )}
        <p className="pb-2 text-sm text-ink-soft">
          {loaded.name}, {loaded.encoding}
        </p>
      </div>
      {table && <ColumnsOfList read={table} correct={correct} />}
      {result.ok ? (
        <>
          <NetlistSummary reading={result.reading} />
          {result.reading.passedOver.length > 0 && (
            <section>
              <h3 className="mb-1 text-base">{counted(result.reading.passedOver.length, "line")} passed over</h3>
              <LineNotes notes={result.reading.passedOver} tone="failed" />
            </section>
          )}
          {result.reading.warnings.length > 0 && (
            <Disclosure summary={`${counted(result.reading.warnings.length, "line")} taken with a doubt`}>
              <LineNotes notes={result.reading.warnings} tone="doubtful" />
            </Disclosure>
          )}
        </>
      ) : (
        <Notice kind="error">{result.sentence}</Notice>
      )}
    </div>
  );
}
