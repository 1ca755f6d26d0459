import type { Transaction } from "@/db/client";
import { findBoard } from "@/db/queries/boards";
import { findConnector, findConnectorsOfBoard } from "@/db/queries/connectors";
import { findSlotConnectors } from "@/db/queries/pin-map";
import { findSlot } from "@/db/queries/slots";
import type { ProjectScope } from "@/lib/access/scope";
import { reject } from "@/lib/actions/answer";
import type { BoardKind } from "@/db/schema/boards";

type Asked = { reference: string; slotId: string | null; takes: string; cabledTo: string | null };
type On = {
  boardId: string;
  kind: BoardKind;
  code: string;
  /** Of the connector that is changed; none for a new one. */ id?: string;
};

/** What a connector joins must be there, and nobody else may claim it. Each refusal names both sides. */
export async function requireJoins(tx: Transaction, scope: ProjectScope, on: On, asked: Asked): Promise<void> {
  await requireOwnReference(tx, scope, on, asked.reference);
  if (asked.slotId !== null) await requireFreeSlot(tx, scope, on, { ...asked, slotId: asked.slotId });
  if (asked.cabledTo !== null) await requireCable(tx, scope, on, asked.cabledTo);
}

async function requireOwnReference(tx: Transaction, scope: ProjectScope, on: On, reference: string) {
  const same = (await findConnectorsOfBoard(tx, scope, on.boardId)).find(
    (one) => one.id !== on.id && one.reference.toLowerCase() === reference.toLowerCase(),
  );
  if (!same) return;
  const sentence = `${on.code} has a connector ${same.reference} already. Choose another reference.`;
  reject("conflict", sentence, { fields: { reference: sentence } });
}

async function requireFreeSlot(tx: Transaction, scope: ProjectScope, on: On, asked: Asked & { slotId: string }) {
  const refused = (sentence: string) => reject("conflict", sentence, { fields: { slotId: sentence } });
  if (on.kind !== "backplane") refused(`${on.code} is a card. Only connectors of the backplane make slots.`);
  const slot = await findSlot(tx, scope, asked.slotId);
  if (!slot) return refused("There is no such slot in this project. Choose one from the list.");
  const other = (await findSlotConnectors(tx, scope)).find(
    ({ connector }) =>
      connector.id !== on.id &&
      connector.slotId === slot.id &&
      connector.takes.toLowerCase() === asked.takes.toLowerCase(),
  );
  if (!other) return;
  const claims = `${other.code} ${other.connector.reference} and ${on.code} ${asked.reference}`;
  refused(`${claims} both claim slot ${slot.position} for the card's ${asked.takes}. One of them must take another.`);
}

async function requireCable(tx: Transaction, scope: ProjectScope, on: On, cabledTo: string) {
  const refused = (sentence: string) => reject("conflict", sentence, { fields: { cabledTo: sentence } });
  if (cabledTo === on.id) refused("A cable leads to another connector, not back to the same one.");
  const far = await findConnector(tx, scope, cabledTo);
  if (!far) return refused("There is no such connector in this project. Choose one from the list.");
  if (on.id === undefined || far.cabledTo !== on.id) return;
  const board = await findBoard(tx, scope, far.boardId);
  refused(`The cable is said at its other end already, ${board?.code ?? ""} ${far.reference}. Once is enough.`);
}
