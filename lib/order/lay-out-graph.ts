import { Graph, layout } from "@dagrejs/dagre";

type Box = { id: string; width: number; height: number };
type Line = { from: string; to: string };
/** A line that is `back` runs against the layers and does not decide who stands before whom. */
type GivenLine = Line & { back?: boolean };

export type PlacedBox = { id: string; x: number; y: number; width: number; height: number };
export type PlacedLine = Line & { path: string };
type Drawing = { width: number; height: number; boxes: PlacedBox[]; lines: PlacedLine[] };

const MARGIN = 8;

type Way = "from left to right" | "from top to bottom";

const WAYS = {
  "from left to right": { rankdir: "LR", nodesep: 14, ranksep: 56 },
  "from top to bottom": { rankdir: "TB", nodesep: 28, ranksep: 36 },
} as const;

/** Where the boxes of a drawing stand and how its lines run, layer by layer; x and y are of the upper left corner. */
export function layOutGraph(
  boxes: readonly Box[],
  lines: readonly GivenLine[],
  way: Way = "from left to right",
): Drawing {
  if (boxes.length === 0) return { width: 0, height: 0, boxes: [], lines: [] };
  const graph = new Graph({ directed: true, multigraph: true })
    .setGraph({ ...WAYS[way], edgesep: 10 })
    .setDefaultEdgeLabel(() => ({}));
  for (const { id, width, height } of boxes) graph.setNode(id, { width, height });
  for (const { from, to, back } of lines) {
    const [first, last] = back ? [to, from] : [from, to];
    graph.setEdge(first, last, {}, nameOf(from, to));
  }
  layout(graph);
  const corners = boxes.map(({ id, width, height }) => {
    const { x = 0, y = 0 } = graph.node(id);
    return { id, width, height, x: x - width / 2, y: y - height / 2 };
  });
  const ways = lines.map(({ from, to, back }) => {
    const points = graph.edge(back ? to : from, back ? from : to, nameOf(from, to))?.points ?? [];
    return { from, to, points: back ? [...points].reverse() : points };
  });
  // Bends may lie beyond what the layout takes for its width.
  const ends = corners.flatMap(({ x, y, width, height }) => [
    { x, y },
    { x: x + width, y: y + height },
  ]);
  const all = [...ends, ...ways.flatMap(({ points }) => points)];
  const [left, top] = [Math.min(...all.map(({ x }) => x)) - MARGIN, Math.min(...all.map(({ y }) => y)) - MARGIN];
  const moved = ({ x, y }: Point) => ({ x: x - left, y: y - top });
  return {
    width: Math.ceil(Math.max(...all.map(({ x }) => x)) - left + MARGIN),
    height: Math.ceil(Math.max(...all.map(({ y }) => y)) - top + MARGIN),
    boxes: corners.map((box): PlacedBox => {
      const { x, y } = moved(box);
      return { ...box, x: round(x), y: round(y) };
    }),
    lines: ways.map(({ from, to, points }): PlacedLine => ({ from, to, path: smooth(points.map(moved)) })),
  };
}

const nameOf = (from: string, to: string) => `${from} to ${to}`;

type Point = { x: number; y: number };

const round = (value: number) => Math.round(value * 10) / 10;
const at = ({ x, y }: Point) => `${round(x)} ${round(y)}`;

/** Straight at both ends, rounded at the bends: a quadratic curve from middle to middle. */
function smooth(points: readonly Point[]): string {
  const [first, ...rest] = points;
  const last = rest.at(-1);
  if (!first || !last) return "";
  const bends = rest.slice(0, -1).map((bend, index) => {
    const next = rest[index + 1] ?? last;
    const end = index === rest.length - 2 ? last : { x: (bend.x + next.x) / 2, y: (bend.y + next.y) / 2 };
    return `Q${at(bend)} ${at(end)}`;
  });
  return bends.length === 0 ? `M${at(first)}L${at(last)}` : `M${at(first)}${bends.join("")}`;
}
