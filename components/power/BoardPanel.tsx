"use client";

import { Button } from "@/components/ui/Button";
import { EmptyState } from "@/components/ui/EmptyState";
import { Notice } from "@/components/ui/Notice";
import { Panel } from "@/components/ui/Panel";
import type { BoardView } from "@/lib/power/power-view";
import { AddLine } from "./AddLine";
import { DrawLines } from "./DrawLines";
import type { PowerActs } from "./power-acts";

type Props = {
  project: string;
  board: BoardView;
  /** Names of the machine's rails. */
  rails: readonly string[];
  canEdit: boolean;
  acts: Pick<PowerActs, "saveLine" | "removeLine">;
};

/** One board: where its current goes, line by line, and what can be added to it. */
export function BoardPanel({ project, board, rails, canEdit, acts }: Props) {
  const made = board.lines.flatMap(({ item }) => (item.kind === "regulator" ? [item.output] : []));
  const choices = [...new Set([...rails, ...made])];
  const add = canEdit && (
    <AddLine
      {...{ project, rails: choices }}
      board={board.code}
      save={acts.saveLine}
      trigger={<Button kind={board.power ? "plain" : "primary"}>Add what it draws</Button>}
    />
  );
  return (
    <Panel
      title={
        <>
          <span className="mono text-[0.9em]">{board.code}</span> {board.name}
        </>
      }
      note="one unit, on its own"
      padding="none"
      actions={board.power && add}
    >
      <div className="flex flex-col gap-3 px-4 not-empty:pb-4 sm:px-5">
        {board.problem && (
          <Notice kind="error" title="It cannot be added up" role="none">
            {board.problem}
          </Notice>
        )}
        {!board.power && board.lines.length === 0 && !board.problem && (
          <EmptyState title="Nothing is known of what it draws" action={add}>
            <p>
              Packages are counted by themselves once the board uses blocks (Parts, Boards). LEDs, pull-ups, regulators
              and parts from a data sheet are added here, or one measured figure for all of it.
            </p>
          </EmptyState>
        )}
        {board.notes.map((note) => (
          <Notice key={note} kind="doubtful">
            {note}
          </Notice>
        ))}
      </div>
      <DrawLines {...{ project, board, canEdit, acts }} rails={choices} />
    </Panel>
  );
}
