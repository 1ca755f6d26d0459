"use client";

import clsx from "clsx";
import type { Net, NetFacts } from "@/lib/calc/interconnect";
import { WEIGHT_WORDS, WeightMark } from "../WeightMark";
import type { NetLine } from "./net-lines";

const MOST_PLACES = 5;

/** Columns of the wide list, of its heads, too. */
export const NET_COLUMNS =
  "grid gap-x-4 grid-cols-[minmax(0,1fr)_auto] sm:grid-cols-[minmax(8rem,1.1fr)_5.5rem_minmax(0,2fr)_minmax(9rem,1.2fr)_1.5rem]";

type Props = {
  line: NetLine;
  index: number;
  factsOf: (net: Net) => NetFacts;
  isChosen: boolean;
  isNarrow: boolean;
  onChoose: (net: string) => void;
};

export function NetRow({ line, index, factsOf, isChosen, isNarrow, onChoose }: Props) {
  const { net, weight, touches } = line;
  const { text, isWrong } = factsOf(net).inShort;
  const name = net.name === "" ? net.id : net.name;
  const others = net.names.filter((one) => one !== net.name);
  return (
    <button
      type="button"
      data-index={index}
      aria-current={isChosen ? "true" : undefined}
      onClick={() => onChoose(net.id)}
      className={clsx(
        "grid h-full w-full items-center gap-x-4 border-b border-rule px-3.5 text-left -outline-offset-2",
        isNarrow ? "grid-cols-[minmax(0,1fr)_auto]" : NET_COLUMNS,
        isChosen ? "bg-copper-ground" : "hover:bg-raised",
      )}
    >
      <span className="flex min-w-0 flex-col">
        <span className={clsx("mono truncate text-sm", net.name === "" ? "text-ink-soft" : "font-semibold")}>
          {name}
          {others.length > 0 && <span className="font-normal text-ink-soft"> / {others.join(" / ")}</span>}
        </span>
        <span className={clsx("truncate text-xs text-ink-soft", !isNarrow && "sm:hidden")}>
          {text === "" ? places(touches) : <span className={isWrong ? "font-semibold text-failed" : ""}>{text}</span>}
        </span>
      </span>
      {!isNarrow && (
        <>
          <span className={clsx("text-sm max-sm:hidden", line.class === "clock" ? "text-copper" : "text-ink-soft")}>
            {line.class}
          </span>
          <span className="mono truncate text-xs max-sm:hidden">{places(touches)}</span>
          <span
            className={clsx("truncate text-sm max-sm:hidden", isWrong ? "font-semibold text-failed" : "text-ink-soft")}
          >
            {text}
          </span>
        </>
      )}
      <span className="flex w-6 justify-end">
        {weight && (
          <>
            <WeightMark weight={weight} size={14} />
            <span className="sr-only">{WEIGHT_WORDS[weight]}</span>
          </>
        )}
      </span>
    </button>
  );
}

function places(touches: readonly string[]): string {
  const rest = touches.length - MOST_PLACES;
  return rest > 0 ? `${touches.slice(0, MOST_PLACES).join(", ")} and ${rest} more` : touches.join(", ");
}
