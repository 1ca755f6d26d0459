import clsx from "clsx";
import type { RackView } from "@/lib/rack/rack-view";
import { CardLink } from "./CardLink";
import { CardStages } from "./CardStages";
import { boardAddress, unitAddress } from "./rack-addresses";
import { ToMend } from "./ToMend";

type Props = {
  backplane: RackView["backplane"];
  project: string | undefined;
  room?: readonly number[];
  isStanding?: boolean;
};

/** The spine's own name and its own checks: the backplane is a board too. */
export function BackplaneFoot({ backplane, project, room, isStanding = false }: Props) {
  if (!backplane) return null;
  const { board, unit } = backplane;
  return (
    <div className={clsx("relative mt-2 flex min-w-0", !isStanding && "pl-7 sm:pl-9")}>
      {!isStanding && (
        <span
          aria-hidden="true"
          className="absolute -top-3 bottom-0 left-7 w-3.5 rounded-b-sm bg-mask sm:left-9 sm:w-5"
        />
      )}
      <CardLink
        href={project && (unit ? unitAddress(project, unit.serial) : boardAddress(project, board.code))}
        className="relative grid min-w-0 flex-1 items-center gap-x-4 gap-y-2 rounded-r-md border-y-4 border-r-4 border-mask bg-raised py-2 pl-8 pr-2 no-underline hover:bg-sheet @3xl:grid-cols-[minmax(9rem,1.15fr)_5.5rem_minmax(25rem,2.9fr)] @3xl:pl-11"
      >
        <span aria-hidden="true" className="absolute inset-y-0 left-0 w-3.5 bg-mask sm:w-5" />
        <span className="font-head text-[1.0625rem] font-semibold leading-tight tracking-tight">{board.name}</span>
        <span className="mono flex flex-wrap gap-x-2.5 text-sm leading-tight @3xl:flex-col">
          <span className="font-semibold">{unit?.serial ?? board.code}</span>
          <span className="text-xs text-ink-soft">{unit ? `rev ${unit.revision}` : "no unit yet"}</span>
          <ToMend board={board} />
        </span>
        {unit && (
          <>
            <span className="hidden @3xl:block">
              <CardStages unit={unit} {...(room ? { room } : {})} />
            </span>
            <span className="@3xl:hidden">
              <CardStages unit={unit} layout="flow" />
            </span>
          </>
        )}
      </CardLink>
    </div>
  );
}
