import { asc, eq } from "drizzle-orm";
import { database } from "@/db/client";
import { findBlockNames, findBomDesignators, findNamedPins } from "@/db/queries/reworks";
import { rails } from "@/db/schema/power";
import { readDesignators } from "@/lib/board-plan/designators";
import { groupBy } from "@/lib/traveler/group-by";

/** A name that can be picked, with what tells it apart: the signal on a pin, the pins of a signal. */
export type BoardName = { name: string; says: string };

/** What there is on a board, for forms that ask what is touched or concerned. */
export type BoardNames = Record<"signals" | "pins" | "parts" | "blocks" | "rails", BoardName[]>;

export async function loadBoardNames(
  scope: { projectId: string },
  board: { id: string; code: string },
): Promise<BoardNames> {
  const db = database();
  const [pins, blocks, bom, railRows] = await Promise.all([
    findNamedPins(db, scope, [board.code]),
    findBlockNames(db, board.id),
    findBomDesignators(db, board.id),
    db
      .select({ name: rails.name })
      .from(rails)
      .where(eq(rails.projectId, scope.projectId))
      .orderBy(asc(rails.position)),
  ]);
  const plain = (name: string): BoardName => ({ name, says: "" });
  const carried = pins.filter(({ signal }) => signal.trim() !== "");
  const bySignal = groupBy(carried, ({ signal }) => signal);
  return {
    signals: [...bySignal]
      .map(([name, own]) => ({ name, says: shortList(own.map(({ connector, pin }) => `${connector} ${pin}`)) }))
      .sort((a, b) => inOrder(a.name, b.name)),
    pins: carried
      .map(({ connector, pin, signal }) => ({ name: `${connector} ${pin}`, says: signal }))
      .sort((a, b) => inOrder(a.name, b.name)),
    parts: bom.flatMap(({ designators, part }) =>
      (readDesignators(designators) ?? []).map((name) => ({ name, says: part })),
    ),
    blocks: blocks.map(plain),
    rails: railRows.map(({ name }) => plain(name)),
  };
}

const inOrder = (one: string, other: string) => one.localeCompare(other, "en", { numeric: true });

const SHOWN = 3;
const shortList = (names: readonly string[]) =>
  names.length <= SHOWN ? names.join(", ") : `${names.slice(0, SHOWN).join(", ")} and ${names.length - SHOWN} more`;
