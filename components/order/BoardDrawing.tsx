import clsx from "clsx";
import type { BoardArrow, BoardBox, BoardOrderView } from "@/lib/order/board-order-view";
import { boardHref } from "./order-addresses";

type Props = { drawing: BoardOrderView["drawing"]; project: string };

type Kind = BoardArrow["kind"];

const KINDS: readonly { kind: Kind; word: string; line: string; head: string; dash?: string }[] = [
  { kind: "supplies", word: "supplies", line: "stroke-copper", head: "fill-copper" },
  { kind: "drives", word: "drives", line: "stroke-ink-soft", head: "fill-ink-soft" },
  { kind: "said", word: "said by somebody", line: "stroke-reopened", head: "fill-reopened", dash: "7 3" },
  { kind: "carries", word: "carries", line: "stroke-rule-strong", head: "fill-rule-strong", dash: "2 4" },
];

/** What carries, supplies and drives what, from left to right; the figure in a box is its place in the order. */
export function BoardDrawing({ drawing: { width, height, boxes, arrows }, project }: Props) {
  const shown = KINDS.filter(({ kind }) => arrows.some((arrow) => arrow.kind === kind));
  return (
    <>
      <div className="overflow-x-auto" tabIndex={0} role="group" aria-label="Drawing of the order, scrolls sideways">
        <svg viewBox={`0 0 ${width} ${height}`} width={width} height={height} className="mx-auto block max-w-none">
          <defs>
            {shown.map(({ kind, head }) => (
              <marker
                key={kind}
                id={`order-${kind}`}
                viewBox="0 0 8 8"
                refX="7"
                refY="4"
                markerWidth="8"
                markerHeight="8"
                markerUnits="userSpaceOnUse"
                orient="auto"
              >
                <path d="M0 0.5 8 4 0 7.5z" className={head} />
              </marker>
            ))}
          </defs>
          <g fill="none" strokeWidth="1.5">
            {[...arrows].sort(byWeight).map((arrow) => {
              const look = KINDS.find(({ kind }) => kind === arrow.kind);
              return (
                <path
                  key={`${arrow.from} ${arrow.to}`}
                  d={arrow.path}
                  className={look?.line}
                  strokeDasharray={look?.dash}
                  markerEnd={`url(#order-${arrow.kind})`}
                >
                  <title>{arrow.sentence}</title>
                </path>
              );
            })}
          </g>
          {boxes.map((box) => (
            <Box key={box.id} box={box} project={project} />
          ))}
        </svg>
      </div>
      <ul aria-label="Lines" className="mt-3 flex flex-wrap gap-x-5 gap-y-1.5 text-sm text-ink-soft">
        {shown.map(({ kind, word, line, dash }) => (
          <li key={kind} className="flex items-center gap-2">
            <svg width="28" height="8" aria-hidden>
              <path d="M0 4h28" strokeWidth="1.5" className={line} strokeDasharray={dash} />
            </svg>
            {word}
          </li>
        ))}
      </ul>
    </>
  );
}

const byWeight = (a: BoardArrow, b: BoardArrow) =>
  KINDS.findIndex(({ kind }) => kind === b.kind) - KINDS.findIndex(({ kind }) => kind === a.kind);

function Box({ box, project }: { box: BoardBox; project: string }) {
  const { id, x, y, width, height, name, number, isNext } = box;
  const standing = number === null ? "proven" : isNext ? "next" : `place ${number} in the order`;
  return (
    <a href={boardHref(project, id)} aria-label={`${id} ${name}, ${standing}`} className="group outline-offset-2">
      <rect
        x={x}
        y={y}
        width={width}
        height={height}
        rx="5"
        strokeWidth={isNext ? 2 : 1}
        className={clsx(
          "fill-raised group-hover:fill-sheet",
          isNext ? "stroke-copper" : number === null ? "stroke-passed" : "stroke-rule-strong",
        )}
      />
      <text x={x + 12} y={y + 22} className="mono fill-ink text-sm font-semibold">
        {id}
      </text>
      <text
        x={x + width - 12}
        y={y + 22}
        textAnchor="end"
        className={clsx("text-sm", number === null ? "fill-passed" : isNext ? "fill-copper" : "fill-ink-soft")}
      >
        {number === null ? "proven" : isNext ? "next" : number}
      </text>
      <text x={x + 12} y={y + 40} className="fill-ink-soft text-xs">
        {name.length > 20 ? `${name.slice(0, 19)}…` : name}
      </text>
    </a>
  );
}
