"use client";

import { useRef } from "react";
import { useWatch } from "react-hook-form";
import { Button } from "@/components/ui/Button";
import { FormComboBox, FormSelect, FormTextField } from "@/components/ui/form/bound-fields";
import { Form } from "@/components/ui/form/Form";
import type { Reply } from "@/components/ui/form/reply";
import { TheirVersion } from "@/components/workshop/TheirVersion";
import { useStaleEdit } from "@/components/workshop/use-stale-edit";
import { connectorChoices } from "@/lib/calc/connector";
import type { ConnectorView, WiringBoard, WiringSlot } from "@/lib/pin-map/load-wiring";
import {
  currentConnector,
  NONE,
  readConnector,
  typedConnector,
  writeConnector,
  type ConnectorValues,
  type TypedConnector,
} from "./connector-fields";

const GRID = { id: "grid", label: "A face of one's own" };

type Given = { boards: readonly WiringBoard[]; slots: readonly WiringSlot[]; connectors: readonly ConnectorView[] };
type Asked = { writeId: string; version: number; boardId: string; position: number };

type Props<Value> = Given & {
  /** The one that is changed; left away for a new one. */
  connector?: ConnectorView;
  /** Proposals for a new one. */
  fresh: TypedConnector;
  save: (values: ConnectorValues, asked: Asked) => Promise<Reply<Value>>;
  onDone: (value: Value) => void;
  onCancel: () => void;
};

/** One form to add a connector and to change it. */
export function ConnectorForm<Value extends object>({
  connector,
  fresh,
  save,
  onDone,
  onCancel,
  ...given
}: Props<Value>) {
  const writeId = useRef(crypto.randomUUID());
  const stale = useStaleEdit(connector?.version ?? 0, (details) => currentConnector.safeParse(details).data);
  const defaults = connector ? writeConnector(connector) : fresh;

  async function send(typed: TypedConnector): Promise<Reply<Value>> {
    const values = readConnector(typed);
    const place = { boardId: typed.boardId, position: Number(typed.position) };
    if (!connector) return save(values, { writeId: writeId.current, version: 0, ...place });
    return stale.send((asked) => save(values, { ...asked, ...place }));
  }

  return (
    <Form<TypedConnector, Value>
      label={connector ? "Connector" : "New connector"}
      schema={typedConnector}
      defaults={defaults}
      action={send}
      onDone={onDone}
      submitLabel={connector ? "Save the connector" : "Add the connector"}
      actions={<Button onPress={onCancel}>Cancel</Button>}
    >
      {(form) => (
        <>
          <Fields {...given} {...(connector ? { connector } : {})} />
          {stale.theirs && (
            <TheirVersion
              rows={(["reference", "type", "takes", "position"] as const).map((name) => ({
                name: name === "type" ? "Face" : name,
                theirs: String(stale.theirs?.[name] ?? ""),
                yours: form.getValues(name),
              }))}
            />
          )}
        </>
      )}
    </Form>
  );
}

function Fields({ boards, slots, connectors, connector }: Given & { connector?: ConnectorView }) {
  const [boardId, type, slotId] = useWatch<TypedConnector, ["boardId", "type", "slotId"]>({
    name: ["boardId", "type", "slotId"],
  });
  const isBackplane = boards.find(({ id }) => id === boardId)?.kind === "backplane";
  const siblings = connectors.filter((one) => one.boardId === boardId);
  const others = connectors.filter(({ id }) => id !== connector?.id);
  return (
    <>
      <div className="grid gap-4 sm:grid-cols-[minmax(0,1fr)_9rem]">
        {connector ? (
          <FormSelect
            name="position"
            label="Its place on the board"
            options={siblings.map((_, index) => ({
              id: String(index + 1),
              label: index === 0 ? "First: the edge connector that the rack draws" : `Number ${index + 1}`,
            }))}
          />
        ) : (
          <FormSelect
            name="boardId"
            label="Board"
            options={boards.map(({ id, code, name }) => ({ id, label: `${code} ${name}` }))}
          />
        )}
        <FormTextField name="reference" label="Reference" mono maxLength={20} />
      </div>
      <FormComboBox name="type" label="Face" options={[...connectorChoices, GRID]} />
      {type === GRID.id && (
        <div className="grid gap-4 sm:grid-cols-3">
          <FormTextField name="rows" label="Rows" mono description="Letters, such as a, b, c. None for a single row." />
          <FormTextField name="positions" label="Positions in each" mono inputMode="numeric" />
          <FormTextField name="pitchMm" label="Pitch" mono inputMode="decimal" suffix="mm" />
        </div>
      )}
      {isBackplane && (
        <div className="grid gap-4 sm:grid-cols-[minmax(0,1fr)_9rem]">
          <FormSelect
            name="slotId"
            label="Makes the slot"
            options={[
              { id: NONE, label: "None" },
              ...slots.map(({ id, position }) => ({ id, label: `Slot ${position}` })),
            ]}
          />
          {slotId !== NONE && (
            <FormTextField
              name="takes"
              label="Takes the card's"
              mono
              maxLength={20}
              description="The card's connector."
            />
          )}
        </div>
      )}
      <FormComboBox
        name="cabledTo"
        label="Cable to"
        description="Pins of the same name are joined. Say it at one end only."
        options={[
          { id: NONE, label: "No cable" },
          ...others.map(({ id, code, reference, boardName }) => ({
            id,
            label: `${code} ${reference}`,
            description: boardName,
          })),
        ]}
      />
    </>
  );
}
