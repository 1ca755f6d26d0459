import { database } from "@/db/client";
import type { ProjectScope } from "@/lib/access/scope";
import { orderBoards, type BoardLink, type BoardOrder } from "@/lib/calc/sequence";
import type { BoardArrow, BoardBox, BoardOrderView } from "./board-order-view";
import { layOutGraph } from "./lay-out-graph";
import { saySaid } from "./overrides";
import { readBoardOrder } from "./read-board-order";

const BOX = { width: 148, height: 52 };
const NOTHING: BoardOrder = { steps: [], proven: [], links: [], risks: [], remarks: [] };

/** The order in which the boards are proven, why, and what people say about it; as a table and as a drawing. */
export async function loadBoardOrder(scope: ProjectScope): Promise<BoardOrderView> {
  const { input, said, boards } = await readBoardOrder(database(), scope);
  const ordered = orderBoards(input);
  const { links, ...order } = ordered.ok ? ordered.value : NOTHING;
  const numbers = new Map(order.steps.map(({ board }, index) => [board, index + 1]));
  // Proven boards stand before all that are not; among themselves the lines decide.
  const place = (code: string) => numbers.get(code) ?? 0;
  const arrows = withoutEveryCarrier(mergeLinks(links));
  const drawn = layOutGraph(
    boards.map(({ code }) => ({ id: code, ...BOX })),
    arrows.map(({ from, to }) => ({ from, to, back: place(to) < place(from) })),
    "from top to bottom",
  );
  const names = new Map(boards.map(({ code, name }) => [code, name]));
  const boxes = drawn.boxes.map((box): BoardBox => {
    const number = numbers.get(box.id) ?? null;
    return { ...box, name: names.get(box.id) ?? "", number, isNext: number === 1 };
  });
  return {
    boards,
    ...order,
    said: said.map((one) => {
      const { id, reason, by, at } = one;
      return { id, words: saySaid(one), reason, by: by ?? "Somebody", at: at.toISOString() };
    }),
    drawing: {
      ...{ width: drawn.width, height: drawn.height, boxes },
      arrows: drawn.lines.flatMap((line): BoardArrow[] => {
        const link = arrows.find(({ from, to }) => from === line.from && to === line.to);
        return link ? [{ ...line, kind: link.kind, sentence: link.sentence }] : [];
      }),
    },
    circle: ordered.ok ? null : ordered.message,
  };
}

/** The weightiest last: of several links between two boards the drawing shows one line. */
const WEIGHTS: readonly BoardLink["kind"][] = ["carries", "drives", "supplies", "said"];

function mergeLinks(links: readonly BoardLink[]): BoardLink[] {
  const pairs = new Map<string, BoardLink>();
  for (const link of links) {
    const key = `${link.from} ${link.to}`;
    const known = pairs.get(key);
    if (!known) {
      pairs.set(key, link);
      continue;
    }
    const heavier = WEIGHTS.indexOf(link.kind) > WEIGHTS.indexOf(known.kind) ? link : known;
    pairs.set(key, { ...heavier, sentence: `${known.sentence} ${link.sentence}` });
  }
  return [...pairs.values()];
}

/** A backplane carries the nets of all: its line is drawn only to boards that no other line reaches. */
const withoutEveryCarrier = (links: readonly BoardLink[]): BoardLink[] =>
  links.filter(
    ({ kind, to }) => kind !== "carries" || !links.some((other) => other.to === to && other.kind !== "carries"),
  );
