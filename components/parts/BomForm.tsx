"use client";

import { z } from "zod";
import { Button } from "@/components/ui/Button";
import { Form } from "@/components/ui/form/Form";
import { Notice } from "@/components/ui/Notice";
import { useStaleEdit } from "@/components/workshop/use-stale-edit";
import type { BoardPlanView } from "@/lib/board-plan/load-board-plan";
import { saveBomInput, type SaveBomTyped } from "@/lib/board-plan/schema";
import { BomRows } from "./BomRows";
import type { BoardPlanActs } from "./parts-acts";

const fields = saveBomInput.omit({ project: true, writeId: true, board: true, version: true });
const current = z.object({ version: z.int() });
export type BomFields = Pick<SaveBomTyped, "lines">;

type Props = {
  project: string;
  view: BoardPlanView;
  save: BoardPlanActs["saveBom"];
  onSaved: () => void;
  onCancel: () => void;
};

export function BomForm({ project, view, save, onSaved, onCancel }: Props) {
  const stale = useStaleEdit(view.version, (details) => current.safeParse(details).data);
  return (
    <Form<BomFields, { version: number }>
      label="Other parts"
      schema={fields}
      defaults={{ lines: view.lines.length > 0 ? view.lines : [EMPTY_LINE] }}
      action={(values) => stale.send((asked) => save({ project, board: view.board.code, ...asked, ...values }))}
      onDone={onSaved}
      submitLabel="Save the list"
      actions={<Button onPress={onCancel}>Leave it as it was</Button>}
    >
      <BomRows />
      {stale.theirs && (
        <Notice kind="reopened">
          What you typed is still here. Save again to put it in place of theirs, or reload the page to look at it first.
        </Notice>
      )}
    </Form>
  );
}

export const EMPTY_LINE = { partNumber: "", description: "", count: "1", designators: "" };
