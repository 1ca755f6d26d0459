import { StateGlyph } from "@/components/ui/glyphs/StateGlyph";
import type { CheckBox, WaitsView } from "@/lib/order/waits-view";
import { checkHref } from "./order-addresses";

type Props = { drawing: WaitsView["drawing"]; project: string };

const MOST_LETTERS = 26;

/** Which check lets which go, from left to right. */
export function WaitsDrawing({ drawing: { width, height, boxes, lines }, project }: Props) {
  return (
    <div className="overflow-x-auto" tabIndex={0} role="group" aria-label="Drawing of what waits, scrolls sideways">
      <svg viewBox={`0 0 ${width} ${height}`} width={width} height={height} className="block max-w-none">
        <defs>
          <marker
            id="order-wait"
            viewBox="0 0 8 8"
            refX="7"
            refY="4"
            markerWidth="8"
            markerHeight="8"
            markerUnits="userSpaceOnUse"
            orient="auto"
          >
            <path d="M0 0.5 8 4 0 7.5z" className="fill-ink-soft" />
          </marker>
        </defs>
        <g fill="none" strokeWidth="1.5" className="stroke-ink-soft">
          {lines.map(({ from, to, path }) => (
            <path key={`${from} ${to}`} d={path} markerEnd="url(#order-wait)" />
          ))}
        </g>
        {boxes.map((box) => (
          <Box key={box.id} box={box} project={project} />
        ))}
      </svg>
    </div>
  );
}

function Box({ box, project }: { box: CheckBox; project: string }) {
  const { x, y, width, height, serial, title, state, checkId } = box;
  return (
    <a
      href={checkHref(project, serial, checkId)}
      aria-label={`${title} of ${serial}, ${state}`}
      className="group outline-offset-2"
    >
      <rect {...{ x, y, width, height }} rx="5" className="fill-raised stroke-rule-strong group-hover:fill-sheet" />
      <g transform={`translate(${x + 10} ${y + 10})`}>
        <StateGlyph state={state} size={13} />
      </g>
      <text x={x + 38} y={y + 21} className="mono fill-ink text-xs font-semibold">
        {serial}
      </text>
      <text x={x + 10} y={y + 42} className="fill-ink text-sm">
        {title.length > MOST_LETTERS ? `${title.slice(0, MOST_LETTERS - 1)}…` : title}
        <title>{title}</title>
      </text>
    </a>
  );
}
