import { desc, eq } from "drizzle-orm";
import { database } from "@/db/client";
import { findBoardByCode } from "@/db/queries/boards";
import { findNetlist, findNetlists } from "@/db/queries/netlists";
import { revisions } from "@/db/schema/boards";
import type { NetlistSource } from "@/db/schema/netlists";
import type { ProjectScope } from "@/lib/access/scope";
import { compareNetlists, netlistOfDesign, type LineNote, type NetlistDifference } from "@/lib/calc/netlist";
import { loadMachine } from "@/lib/machine/load-machine";
import { storedNetlist } from "./stored-netlist";

export type NetlistVersion = {
  id: string;
  letter: string;
  number: number;
  source: NetlistSource;
  fileName: string;
  nets: number;
  points: number;
  passedOver: LineNote[];
  by: string | null;
  at: string;
};

type Counted<Item> = { count: number; shown: Item[] };
/** As compareNetlists() says it, with the first of each and how many there are. */
export type ShownDifference = {
  before: string;
  after: string;
} & { [Key in keyof NetlistDifference]: Counted<NetlistDifference[Key][number]> };

export type NetlistsView = {
  board: { code: string; name: string; archived: boolean };
  revisions: { id: string; letter: string }[];
  versions: NetlistVersion[];
  /** What the project's own pin map would give. */
  pinMap: { nets: number; points: number };
  difference: ShownDifference | undefined;
};

const SHOWN = 300;

export async function loadNetlists(
  scope: ProjectScope,
  code: string,
  compared: { before: string | undefined; after: string | undefined },
): Promise<NetlistsView | undefined> {
  const db = database();
  const board = await findBoardByCode(db, scope, code.toUpperCase());
  if (!board) return undefined;
  const [letters, rows, machine] = await Promise.all([
    db
      .select({ id: revisions.id, letter: revisions.letter })
      .from(revisions)
      .where(eq(revisions.boardId, board.id))
      .orderBy(desc(revisions.createdAt)),
    findNetlists(db, scope, board.id),
    loadMachine(db, scope),
  ]);
  const design = machine.boards.find((one) => one.code === board.code);
  const { nets, unconnected } = netlistOfDesign(design ?? { connectors: [] });
  const isOwn = (id: string | undefined): id is string => rows.some((row) => row.id === id);
  const { before, after } = compared;
  return {
    board: { code: board.code, name: board.name, archived: board.archivedAt !== null },
    revisions: letters,
    versions: rows.map(({ createdAt, revisionId: _, ...row }) => ({ ...row, at: createdAt.toISOString() })),
    pinMap: {
      nets: nets.length,
      points: nets.reduce((sum, net) => sum + net.points.length, unconnected.length),
    },
    difference: isOwn(before) && isOwn(after) ? await differenceOf(scope, before, after) : undefined,
  };
}

async function differenceOf(scope: ProjectScope, before: string, after: string): Promise<ShownDifference | undefined> {
  const db = database();
  const [old, now] = await Promise.all([findNetlist(db, scope, before), findNetlist(db, scope, after)]);
  if (!old || !now) return undefined;
  const found = compareNetlists(storedNetlist(old.netlist.content), storedNetlist(now.netlist.content));
  return {
    before,
    after,
    gained: first(found.gained),
    lost: first(found.lost),
    renamed: first(found.renamed),
    moved: first(found.moved),
    pinsGained: first(found.pinsGained),
    pinsLost: first(found.pinsLost),
  };
}

const first = <Item>(items: readonly Item[]): Counted<Item> => ({ count: items.length, shown: items.slice(0, SHOWN) });
