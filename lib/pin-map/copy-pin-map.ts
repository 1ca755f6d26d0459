import type { Transaction } from "@/db/client";
import { findConnectorsOfBoard, lockConnector } from "@/db/queries/connectors";
import { findPinsOf, findSlotConnectors, putPins, raiseConnector, takePins } from "@/db/queries/pin-map";
import { findSlot } from "@/db/queries/slots";
import { connectors } from "@/db/schema/wiring";
import type { ProjectScope } from "@/lib/access/scope";
import { reject, type Answer } from "@/lib/actions/answer";
import { lockWithBoard } from "@/lib/connector/lock-with-board";
import { change } from "@/lib/event/change";
import { recordEvent } from "@/lib/event/record-event";
import { refreshFindings } from "@/lib/machine/refresh-findings";
import { nextReference } from "./next-reference";
import { rejectStale } from "./save-pin-map";
import type { CopyPinMapInput } from "./schema";

type Source = NonNullable<Awaited<ReturnType<typeof lockConnector>>>;
type Target = CopyPinMapInput["slots"][number];

/**
 * Puts the pin map of one slot's connector into other slots. A slot without a connector for the same plug of the card
 * gets one of the same face; one that has it loses what its pins carried.
 */
export async function copyPinMap(
  scope: ProjectScope,
  input: CopyPinMapInput,
): Promise<Answer<{ slots: number; pins: number }>> {
  const { projectId, viewer } = scope;
  return change({ writeId: input.writeId, userId: viewer.userId, action: "copy-pin-map" }, async (tx) => {
    const { connector: source, board } = await lockWithBoard(tx, scope, input.connectorId);
    const { id, version, reference } = source;
    const { code } = board;
    if (board.kind !== "backplane")
      reject("invalid", `${code} is a card. Pin maps are copied between slots of the backplane.`);
    if (version !== input.version) await rejectStale(tx, scope, { id, version, name: `${code} ${reference}` });
    const rows = (await findPinsOf(tx, id)).map(({ id: _id, connectorId: _own, ...row }) => row);
    const to: string[] = [];
    for (const target of input.slots) {
      const { connectorId, position } = await connectorFor(tx, scope, source, target);
      await takePins(
        tx,
        connectorId,
        (await findPinsOf(tx, connectorId)).map(({ pin }) => pin),
      );
      await putPins(tx, connectorId, rows);
      await raiseConnector(tx, connectorId);
      to.push(`slot ${position}`);
    }
    const subject = { projectId, actorId: viewer.userId, subjectId: id };
    const inOrder = to.sort((one, other) => one.localeCompare(other, "en", { numeric: true }));
    await recordEvent(tx, subject, "pin-map.copied", { code, reference, to: inOrder, pins: rows.length });
    await refreshFindings(tx, scope);
    return { slots: to.length, pins: rows.length };
  });
}

async function connectorFor(tx: Transaction, scope: ProjectScope, source: Source, { slotId, version }: Target) {
  const slot = await findSlot(tx, scope, slotId);
  if (!slot) return reject("not-found", "One of the slots is not there any more. Nothing was copied.");
  const { position } = slot;
  const takes = source.takes.toLowerCase();
  const there = (await findSlotConnectors(tx, scope)).find(
    ({ connector }) => connector.slotId === slotId && connector.takes.toLowerCase() === takes,
  );
  if (there?.connector.id === source.id)
    return reject("invalid", "A pin map is copied to other slots, not onto itself.");
  const locked = there && (await lockConnector(tx, scope, there.connector.id));
  if (locked) {
    const { id, version: now, reference } = locked;
    if (now !== version) await rejectStale(tx, scope, { id, version: now, name: `${there.code} ${reference}` });
    return { connectorId: id, position };
  }
  if (version !== null) return reject("conflict", `The connector of slot ${position} is gone. Nothing was copied.`);
  const all = await findConnectorsOfBoard(tx, scope, source.boardId);
  const [made] = await tx
    .insert(connectors)
    .values({
      projectId: scope.projectId,
      boardId: source.boardId,
      reference: nextReference(
        source.reference,
        position,
        all.map(({ reference }) => reference),
      ),
      type: source.type,
      grid: source.grid,
      position: Math.max(0, ...all.map((one) => one.position)) + 1,
      slotId,
      takes: source.takes,
    })
    .returning({ id: connectors.id });
  if (!made) return reject("conflict", `Slot ${position} could not get a connector. Nothing was copied.`);
  return { connectorId: made.id, position };
}
