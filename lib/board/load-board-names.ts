import { asc, eq } from "drizzle-orm";
import { database } from "@/db/client";
import { findBlockNames, findBomDesignators, findCopper, findNamedPins } from "@/db/queries/reworks";
import { rails } from "@/db/schema/power";
import { readDesignators } from "@/lib/board-plan/designators";
import { groupBy } from "@/lib/traveler/group-by";

/** A name that can be picked, with what tells it apart: the signal on a pin, the pins of a signal. */
export type BoardName = { name: string; says: string };

/** More names would slow the page down; what is not offered can be typed. */
const MOST_POINTS = 3000;

/** What there is on a board, for forms that ask what is touched or concerned. */
export type BoardNames = Record<"signals" | "pins" | "parts" | "blocks" | "rails", BoardName[]>;

export async function loadBoardNames(
  scope: { projectId: string },
  board: { id: string; code: string },
  revisionId: string,
): Promise<BoardNames> {
  const db = database();
  const [pins, blocks, bom, railRows, copper] = await Promise.all([
    findNamedPins(db, scope, [board.code]),
    findBlockNames(db, board.id),
    findBomDesignators(db, board.id),
    db
      .select({ name: rails.name })
      .from(rails)
      .where(eq(rails.projectId, scope.projectId))
      .orderBy(asc(rails.position)),
    findCopper(db, scope, revisionId, { limit: MOST_POINTS }),
  ]);
  const plain = (name: string): BoardName => ({ name, says: "" });
  const own = pins.filter(({ signal }) => signal.trim() !== "");
  const known = new Set(own.map(({ connector, pin }) => `${connector} ${pin}`.toUpperCase()));
  const carried = [
    ...own,
    ...copper
      .map(({ part, pin, net }) => ({ connector: part, pin, signal: net }))
      .filter(({ connector, pin }) => !known.has(`${connector} ${pin}`.toUpperCase())),
  ];
  const references = new Set(own.map(({ connector }) => connector));
  const bought = bom.flatMap(({ designators, part }) =>
    (readDesignators(designators) ?? []).map((name) => ({ name, says: part })),
  );
  const bySignal = groupBy(carried, ({ signal }) => signal);
  return {
    signals: [...bySignal]
      .map(([name, places]) => ({ name, says: shortList(places.map(({ connector, pin }) => `${connector} ${pin}`)) }))
      .sort((a, b) => inOrder(a.name, b.name)),
    pins: carried
      .map(({ connector, pin, signal }) => ({ name: `${connector} ${pin}`, says: signal }))
      .sort((a, b) => inOrder(a.name, b.name)),
    parts: [
      ...bought,
      ...[...new Set(copper.map(({ part }) => part))]
        .filter((part) => !references.has(part) && !bought.some(({ name }) => name === part))
        .map(plain),
    ].sort((a, b) => inOrder(a.name, b.name)),
    blocks: blocks.map(plain),
    rails: railRows.map(({ name }) => plain(name)),
  };
}

const inOrder = (one: string, other: string) => one.localeCompare(other, "en", { numeric: true });

const SHOWN = 3;
const shortList = (names: readonly string[]) =>
  names.length <= SHOWN ? names.join(", ") : `${names.slice(0, SHOWN).join(", ")} and ${names.length - SHOWN} more`;
