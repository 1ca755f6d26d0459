import { Graph, layout } from "@dagrejs/dagre";

type Box = { id: string; width: number; height: number };
type Line = { from: string; to: string };

export type PlacedBox = { id: string; x: number; y: number; width: number; height: number };
export type PlacedLine = Line & { path: string };
export type Drawing = { width: number; height: number; boxes: PlacedBox[]; lines: PlacedLine[] };

const MARGIN = 8;

type Way = "from left to right" | "from top to bottom";

const WAYS = {
  "from left to right": { rankdir: "LR", nodesep: 14, ranksep: 56 },
  "from top to bottom": { rankdir: "TB", nodesep: 28, ranksep: 36 },
} as const;

/** Where the boxes of a drawing stand and how its lines run, layer by layer; x and y are of the upper left corner. */
export function layOutGraph(boxes: readonly Box[], lines: readonly Line[], way: Way = "from left to right"): Drawing {
  if (boxes.length === 0) return { width: 0, height: 0, boxes: [], lines: [] };
  const graph = new Graph({ directed: true })
    .setGraph({ ...WAYS[way], edgesep: 10, marginx: MARGIN, marginy: MARGIN })
    .setDefaultEdgeLabel(() => ({}));
  for (const { id, width, height } of boxes) graph.setNode(id, { width, height });
  for (const { from, to } of lines) graph.setEdge(from, to);
  layout(graph);
  const placed = boxes.map(({ id, width, height }): PlacedBox => {
    const { x = 0, y = 0 } = graph.node(id);
    return { id, width, height, x: round(x - width / 2), y: round(y - height / 2) };
  });
  const drawn = lines.map(({ from, to }): PlacedLine => {
    return { from, to, path: smooth(graph.edge(from, to)?.points ?? []) };
  });
  const { width = 0, height = 0 } = graph.graph();
  return { width: Math.ceil(width), height: Math.ceil(height), boxes: placed, lines: drawn };
}

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
