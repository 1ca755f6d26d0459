import type { Transaction } from "@/db/client";
import { findBoard } from "@/db/queries/boards";
import { lockConnector } from "@/db/queries/connectors";
import { findLastWiringChange, findPinsOf, putPins, raiseConnector, takePins } from "@/db/queries/pin-map";
import type { ProjectScope } from "@/lib/access/scope";
import { reject, type Answer } from "@/lib/actions/answer";
import { faceOf } from "@/lib/calc/connector";
import { change } from "@/lib/event/change";
import { recordEvent } from "@/lib/event/record-event";
import { designPin } from "@/lib/machine/load-machine";
import { refreshFindings } from "@/lib/machine/refresh-findings";
import { knownNames } from "./known-names";
import { readPinRows } from "./read-pin-rows";
import type { SavePinMapInput } from "./schema";

const MOST_SENTENCES = 3;

type Saved = { version: number; pins: number };

/** Saves changed rows of one connector: all of them or none, and only onto the version that was looked at. */
export async function savePinMap(scope: ProjectScope, input: SavePinMapInput): Promise<Answer<Saved>> {
  const write = { writeId: input.writeId, userId: scope.viewer.userId, action: "save-pin-map" };
  return change(write, async (tx) => {
    const saved = await writePinMap(tx, scope, input);
    if (saved.pins > 0) await refreshFindings(tx, scope);
    return saved;
  });
}

/** The same inside a change that saves more than one connector; the caller refreshes the findings. */
export async function writePinMap(
  tx: Transaction,
  scope: ProjectScope,
  input: Pick<SavePinMapInput, "connectorId" | "version" | "pins">,
): Promise<Saved> {
  const connector = await lockConnector(tx, scope, input.connectorId);
  const board = connector && (await findBoard(tx, scope, connector.boardId));
  if (!connector || !board) return reject("not-found", "There is no such connector in this project.");
  const { id, reference } = connector;
  const name = `${board.code} ${reference}`;
  if (connector.version !== input.version) await rejectStale(tx, scope, { id, version: connector.version, name });
  const face = faceOf(connector);
  if (!face) return reject("conflict", `${name} has no face. Give it a type first.`);
  const kept = (await findPinsOf(tx, id)).map(({ pin }) => pin);
  const read = readPinRows(input.pins, { reference: name, face, kept }, await knownNames(tx, scope));
  const sentences = Object.values(read.problems);
  if (sentences.length > 0) reject("invalid", firstOf(sentences), { fields: read.problems });
  const pins = read.put.length + read.take.length;
  if (pins === 0) return { version: connector.version, pins };
  await takePins(tx, id, read.take);
  await putPins(tx, id, read.put);
  const version = await raiseConnector(tx, id);
  const subject = { projectId: scope.projectId, actorId: scope.viewer.userId, subjectId: id };
  await recordEvent(tx, subject, "pin-map.edited", { code: board.code, reference, pins });
  return { version, pins };
}

function firstOf(sentences: readonly string[]): string {
  const more = sentences.length - MOST_SENTENCES;
  return [...sentences.slice(0, MOST_SENTENCES), ...(more > 0 ? [`And ${more} more.`] : []), "Nothing was saved."].join(
    " ",
  );
}

/** Never merged: who saved and what stands there now go back, and the person decides. */
export async function rejectStale(
  tx: Transaction,
  scope: ProjectScope,
  { id, version, name }: { id: string; version: number; name: string },
): Promise<never> {
  const last = await findLastWiringChange(tx, scope, id);
  const by = last?.by ?? "Somebody";
  const pins = (await findPinsOf(tx, id)).map((row) => ({ ...designPin(row), note: row.note }));
  return reject("conflict", `${by} changed ${name} meanwhile. Look at both and decide; nothing was saved.`, {
    details: { current: { version, by, at: last?.at.toISOString() ?? null, pins } },
  });
}
