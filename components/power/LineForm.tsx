"use client";

import { useState } from "react";
import { Button } from "@/components/ui/Button";
import { Form } from "@/components/ui/form/Form";
import type { Reply } from "@/components/ui/form/reply";
import { Notice } from "@/components/ui/Notice";
import { powerLineItem, type PowerLineItem } from "@/lib/power/line-item";
import { typedLineForm, type TypedLine } from "@/lib/power/typed-line";
import { blankLine, lineWords, writeLine } from "@/lib/power/line-kinds";
import { LineFields } from "./LineFields";
import type { PowerActs } from "./power-acts";

type Saved = { line: string; item: PowerLineItem };

type Props = {
  project: string;
  board: string;
  /** The line that is changed, or the kind of a new one. */
  line: { id: string; item: PowerLineItem } | { kind: PowerLineItem["kind"] };
  /** Rails that it can take from. */
  rails: readonly string[];
  save: PowerActs["saveLine"];
  onDone: (saved: Saved) => void;
  onCancel: () => void;
};

/** One thing that a board draws, figures as people write them. */
export function LineForm({ project, board, line, rails, save, onDone, onCancel }: Props) {
  const item = "item" in line ? line.item : null;
  const kind = "item" in line ? line.item.kind : line.kind;
  const [seen, setSeen] = useState(item);
  const [isOvertaken, setOvertaken] = useState(false);

  async function send(typed: TypedLine): Promise<Reply<Saved>> {
    const write = { project, writeId: crypto.randomUUID(), board, line: "item" in line ? line.id : "" };
    const reply = await save({ ...write, seen, typed });
    if (reply.ok) return reply;
    const theirs = currentOf(reply.error);
    if (theirs) {
      setSeen(theirs);
      setOvertaken(true);
    }
    const fields = Object.entries(reply.error.fields ?? {}).map(([path, text]) => [path.replace(/^typed\./, ""), text]);
    return { ok: false, error: { ...reply.error, fields: Object.fromEntries(fields) } };
  }

  return (
    <Form<TypedLine, Saved>
      label="Line"
      schema={typedLineForm}
      defaults={item ? writeLine(item) : blankLine(kind, rails[0] ?? "")}
      action={send}
      onDone={onDone}
      submitLabel={item ? "Save the line" : "Add the line"}
      actions={<Button onPress={onCancel}>Cancel</Button>}
    >
      <LineFields kind={kind} rails={rails} />
      {isOvertaken && seen && (
        <Notice kind="reopened" title="Somebody saved this meanwhile">
          <p>
            There is now: {lineWords(seen)}. What you typed is still in the form; save again to put it in its place.
          </p>
        </Notice>
      )}
    </Form>
  );
}

function currentOf(error: object): PowerLineItem | undefined {
  const details = "details" in error ? error.details : undefined;
  const current = typeof details === "object" && details !== null && "current" in details ? details.current : undefined;
  return powerLineItem.safeParse(current).data;
}
