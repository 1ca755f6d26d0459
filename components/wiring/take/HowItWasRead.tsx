"use client";

import { ColumnTable } from "@/components/table-file/ColumnTable";
import { Panel } from "@/components/ui/Panel";
import type { FileColumn } from "@/lib/pin-map-file/guess-columns";
import { COLUMN_NAMES } from "@/lib/pin-map/pin-columns";
import type { TakeRead, TakeState } from "./use-take-state";

const NAMES: Record<FileColumn, string> = { board: "Board", connector: "Connector", pin: "Pin", ...COLUMN_NAMES };

type Props = { file: { name: string; encoding: string }; read: TakeRead; correct: TakeState["correct"] };

export function HowItWasRead({ file, read: { table, hasHeadings, mapping }, correct }: Props) {
  return (
    <Panel title="How it was read" note={`${file.name}, ${file.encoding}`}>
      <ColumnTable {...{ table, hasHeadings, mapping, correct }} names={NAMES} />
    </Panel>
  );
}
