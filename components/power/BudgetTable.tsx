import clsx from "clsx";
import Link from "next/link";
import type { MachinePower, RailDraw, Spread } from "@/lib/calc/power";
import type { BoardView, RailView } from "@/lib/power/power-view";
import { amps, watts } from "./figures";

type Props = {
  boards: readonly BoardView[];
  rails: readonly RailView[];
  machine: MachinePower | null;
  /** Code of the board that is looked at. */
  chosen: string;
  addressOf: (board: string) => string;
};

/** What one unit of each board takes from each rail; the last line is the assembled machine. */
export function BudgetTable({ boards, rails, machine, chosen, addressOf }: Props) {
  const shown = rails.filter(({ name }) => boards.some((board) => drawOf(board, name)));
  return (
    <div
      className="relative min-w-0 overflow-x-auto"
      tabIndex={0}
      role="group"
      aria-label="What each board draws, scrolls sideways"
    >
      <table className="w-full border-collapse text-left text-[0.9375rem]">
        <thead>
          <tr className="border-b border-rule-strong text-sm">
            <th scope="col" className="py-2 pl-4 pr-3 font-semibold sm:pl-5">
              Board
            </th>
            <th scope="col" className="hidden px-3 py-2 font-semibold sm:table-cell">
              In the machine
            </th>
            {shown.map(({ name }) => (
              <th key={name} scope="col" className="mono px-3 py-2 text-right font-semibold">
                {name}
              </th>
            ))}
            <th scope="col" className="py-2 pl-3 pr-4 text-right font-semibold sm:pr-5">
              Heat
            </th>
          </tr>
        </thead>
        <tbody>
          {boards.map((board) => (
            <tr
              key={board.code}
              className={clsx(
                "border-b border-rule",
                board.code === chosen ? "bg-copper-ground/60" : "hover:bg-raised",
              )}
            >
              <th scope="row" className="py-2 pl-4 pr-3 font-normal sm:pl-5">
                <Link
                  href={addressOf(board.code)}
                  aria-current={board.code === chosen ? "true" : undefined}
                  className="link mono text-sm font-semibold"
                >
                  {board.code}
                </Link>{" "}
                <span className="hidden text-ink-soft sm:inline">{board.name}</span>
              </th>
              <td className="hidden px-3 py-2 text-sm text-ink-soft sm:table-cell">{standing(board.units)}</td>
              {board.power ? (
                <>
                  {shown.map(({ name }) => (
                    <td key={name} className="px-3 py-2 text-right">
                      <Draw draw={drawOf(board, name)} />
                    </td>
                  ))}
                  <td className="py-2 pl-3 pr-4 text-right sm:pr-5">
                    <Figures spread={board.power.heatW} write={watts} />
                  </td>
                </>
              ) : (
                <td colSpan={shown.length + 1} className="py-2 pl-3 pr-4 text-right text-sm text-ink-soft sm:pr-5">
                  {board.problem ? "cannot be added up" : "not known"}
                </td>
              )}
            </tr>
          ))}
        </tbody>
        {machine && shown.length > 0 && (
          <tfoot>
            <tr className="font-semibold">
              <th scope="row" colSpan={1} className="py-2.5 pl-4 pr-3 font-semibold sm:pl-5">
                Machine
              </th>
              <td className="hidden px-3 py-2.5 text-sm font-normal text-ink-soft sm:table-cell">all that is known</td>
              {shown.map(({ name }) => {
                const sum = machine.margins.find((margin) => margin.rail === name)?.sum;
                return (
                  <td key={name} className="px-3 py-2.5 text-right">
                    {sum ? <Figures spread={sum} write={amps} /> : null}
                  </td>
                );
              })}
              <td className="py-2.5 pl-3 pr-4 text-right sm:pr-5">
                <Figures spread={machine.heatTotalW} write={watts} />
              </td>
            </tr>
          </tfoot>
        )}
      </table>
    </div>
  );
}

const drawOf = ({ power }: BoardView, rail: string): RailDraw | undefined =>
  power?.rails.find((draw) => draw.rail === rail);

const standing = (units: readonly string[]) => (units.length > 3 ? `${units.length} times` : units.join(", "));

function Draw({ draw }: { draw: RailDraw | undefined }) {
  if (!draw) return <span className="text-ink-faint">–</span>;
  if (draw.madeHere) return <span className="text-sm text-ink-soft">makes it</span>;
  return (
    <>
      <Figures spread={draw.taken} write={amps} />
      {draw.source === "typed" && <span className="block text-xs text-ink-soft">typed in</span>}
    </>
  );
}

/** Worst first: it is what the supply must give. */
function Figures({ spread, write }: { spread: Spread; write: (value: number) => string }) {
  return (
    <span className="mono inline-flex flex-col items-end whitespace-nowrap text-sm leading-snug">
      <span>
        <span className="sr-only">at worst </span>
        {write(spread.worst)}
      </span>
      <span className="text-xs font-normal text-ink-soft">
        <span className="sr-only">as a rule </span>
        {write(spread.typical)}
      </span>
    </span>
  );
}
