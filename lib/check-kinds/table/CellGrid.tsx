import clsx from "clsx";
import { StateGlyph } from "@/components/ui/glyphs/StateGlyph";
import type { Cell, CellPlace } from "./cells";
import type { Spec } from "./schema";

type Props = { spec: Spec; cells: readonly Cell[]; at: CellPlace; onChoose: (at: CellPlace) => void };

const GROUND = {
  conforms: "bg-passed-ground text-passed",
  "guard-band": "bg-doubtful-ground text-doubtful",
  "does-not-conform": "bg-failed-ground text-failed",
};

/** The whole table small, as overview; touching a cell takes it up. */
export function CellGrid({ spec, cells, at, onChoose }: Props) {
  return (
    <div className="max-h-40 overflow-auto" role="group" aria-label="All cells">
      <table className="w-full border-collapse text-sm">
        <thead>
          <tr>
            <td />
            {spec.columns.map((column) => (
              <th key={column} scope="col" className="text-ink-soft px-1 pb-1 text-left text-xs font-normal">
                {column}
              </th>
            ))}
          </tr>
        </thead>
        <tbody>
          {spec.rows.map((row, r) => (
            <tr key={row.label}>
              <th scope="row" className="pr-2 text-left text-xs font-semibold">
                {row.label}
              </th>
              {cells
                .filter((cell) => cell.row === r)
                .map((cell) => (
                  <td key={cell.column} className="p-0.5">
                    <CellButton cell={cell} isChosen={at.row === r && at.column === cell.column} onChoose={onChoose} />
                  </td>
                ))}
            </tr>
          ))}
        </tbody>
      </table>
    </div>
  );
}

function CellButton({
  cell,
  isChosen,
  onChoose,
}: {
  cell: Cell;
  isChosen: boolean;
  onChoose: (at: CellPlace) => void;
}) {
  const verdict = cell.judged?.ok ? cell.judged.verdict : undefined;
  const wrong = cell.judged && !cell.judged.ok;
  return (
    <button
      type="button"
      aria-pressed={isChosen}
      aria-label={`${cell.label}: ${cell.typed === "" ? "empty" : `${cell.typed} ${cell.unit}`}`}
      onPointerDown={(event) => event.preventDefault()}
      onClick={() => onChoose({ row: cell.row, column: cell.column })}
      className={clsx(
        "mono flex min-h-11 w-full min-w-14 items-center justify-between gap-1 rounded border px-1.5 text-sm",
        isChosen ? "border-copper outline-copper outline-2 -outline-offset-1" : "border-rule-strong",
        verdict ? GROUND[verdict] : wrong ? "bg-failed-ground text-failed" : "bg-raised text-ink-soft",
      )}
    >
      <span className="truncate">{cell.typed || "·"}</span>
      {verdict === "does-not-conform" && <StateGlyph state="failed" size={10} />}
    </button>
  );
}
