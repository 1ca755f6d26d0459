"use client";

import type { RailDraw } from "@/lib/calc/power";
import { pairLines, type PairedLine } from "@/lib/power/pair-lines";
import type { BoardView } from "@/lib/power/power-view";
import { DrawRow, type RowContext } from "./DrawRow";
import { amps, volts } from "./figures";

type Props = Omit<RowContext, "board"> & { board: BoardView };

/** Rail by rail the lines that add up to its current; what was typed in can be changed where it stands. */
export function DrawLines({ board, ...rest }: Props) {
  const drawn = board.power?.rails ?? [];
  const context = { ...rest, board: board.code };
  const loose = board.lines.filter(({ item }) => !drawn.some(({ rail }) => rail === item.rail));
  return (
    <>
      {drawn.map((draw) => {
        const typed = board.lines.filter(({ item }) => item.rail === draw.rail);
        return <RailSection key={draw.rail} draw={draw} lines={pairLines(draw.lines, typed)} context={context} />;
      })}
      {loose.length > 0 && <Rows lines={loose.map((typed) => ({ draw: null, typed }))} context={context} />}
    </>
  );
}

type SectionProps = { draw: RailDraw; lines: readonly PairedLine[]; context: RowContext };

function RailSection({ draw, lines, context }: SectionProps) {
  return (
    <section aria-label={`From ${draw.rail}`}>
      <h3 className="flex flex-wrap items-baseline gap-x-3 border-t border-rule bg-raised px-4 py-2 text-base sm:px-5">
        <span className="mono text-[0.9375rem]">{draw.rail}</span>
        <span className="font-text text-sm font-normal text-ink-soft">{said(draw)}</span>
      </h3>
      <Rows lines={lines} context={context} />
    </section>
  );
}

function Rows({ lines, context }: { lines: readonly PairedLine[]; context: RowContext }) {
  return (
    <ul>
      {lines.map((line, index) => (
        <DrawRow key={line.typed?.id ?? `${line.draw?.label ?? ""} ${index}`} line={line} {...context} />
      ))}
    </ul>
  );
}

function said({ madeHere, volts: rail, taken, source, computed, lines }: RailDraw): string {
  const made = madeHere ? `made here at ${volts(rail)}; ` : "";
  const sum = `${amps(taken.worst)} at worst, ${amps(taken.typical)} as a rule`;
  if (source === "computed" || lines.length === 0) return `${made}${sum}`;
  return `${made}${sum}, typed in; the lines below add up to ${amps(computed.worst)} at worst`;
}
