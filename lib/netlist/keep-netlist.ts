import { createHash } from "node:crypto";
import type { Transaction } from "@/db/client";
import { findRevision, lockBoard } from "@/db/queries/boards";
import { nextNetlistNumber } from "@/db/queries/netlists";
import { netlists } from "@/db/schema/netlists";
import type { ProjectScope } from "@/lib/access/scope";
import { reject, type Answer } from "@/lib/actions/answer";
import { netlistOfDesign, type LineNote, type Netlist } from "@/lib/calc/netlist";
import { change } from "@/lib/event/change";
import { recordEvent } from "@/lib/event/record-event";
import { loadMachine } from "@/lib/machine/load-machine";
import { readFile } from "./read-file";
import type { KeepNetlistInput } from "./schema";

type Kept = { id: string; number: number };
type Content = { netlist: Netlist; passedOver: LineNote[]; text: string; fileName: string };

/** Lines beyond are counted by the reader's last notes. */
const MOST_NOTES = 300;

/** Keeps a netlist as the next version of a revision. What was kept before stays, with the rounds that were made from it. */
export async function keepNetlist(scope: ProjectScope, input: KeepNetlistInput): Promise<Answer<Kept>> {
  const { projectId, viewer } = scope;
  return change({ writeId: input.writeId, userId: viewer.userId, action: "keep-netlist" }, async (tx) => {
    const found = await findRevision(tx, scope, input.revisionId);
    if (!found) return reject("not-found", "There is no such revision in this project.");
    const { board, revision } = found;
    await lockBoard(tx, scope, board.id);
    if (board.archivedAt !== null) return reject("gone", `${board.name} is archived. Restore it first.`);
    const { netlist, passedOver, text, fileName } = await contentOf(tx, scope, board.code, input);
    const number = await nextNetlistNumber(tx, revision.id);
    const points = netlist.nets.reduce((sum, net) => sum + net.points.length, netlist.unconnected.length);
    const [row] = await tx
      .insert(netlists)
      .values({
        ...{ projectId, number, fileName, points, passedOver: passedOver.slice(0, MOST_NOTES) },
        revisionId: revision.id,
        source: netlist.source,
        sha256: createHash("sha256").update(text).digest("hex"),
        content: netlist,
        nets: netlist.nets.length,
        createdBy: viewer.userId,
      })
      .returning({ id: netlists.id });
    if (!row) throw new Error("the netlist was not inserted");
    const subject = { projectId, actorId: viewer.userId, subjectId: row.id };
    const { code } = board;
    await recordEvent(tx, subject, "netlist.kept", {
      code,
      letter: revision.letter,
      number,
      nets: netlist.nets.length,
    });
    return { id: row.id, number };
  });
}

async function contentOf(
  tx: Transaction,
  scope: ProjectScope,
  code: string,
  { given }: KeepNetlistInput,
): Promise<Content> {
  if (given.source !== "pin-map") {
    const read = readFile(given);
    if (!read.ok) return reject("invalid", `${read.sentence} Nothing was kept.`);
    const { netlist, passedOver } = read.reading;
    return { netlist, passedOver, text: given.text, fileName: given.fileName };
  }
  const design = (await loadMachine(tx, scope)).boards.find((board) => board.code === code);
  const netlist = netlistOfDesign(design ?? { connectors: [] });
  if (netlist.nets.length === 0) {
    return reject("invalid", `The pin map of ${code} names no signal yet. Nothing was kept.`);
  }
  return { netlist, passedOver: [], text: JSON.stringify(netlist), fileName: "" };
}
