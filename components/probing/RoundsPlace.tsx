import Link from "next/link";
import { Page } from "@/components/shell/Page";
import { ButtonLink } from "@/components/ui/ButtonLink";
import { DateTime } from "@/components/ui/DateTime";
import { EmptyState } from "@/components/ui/EmptyState";
import { Panel } from "@/components/ui/Panel";
import { ProgressBar } from "@/components/ui/ProgressBar";
import { counted } from "@/components/workshop/counted";
import type { RoundLine, RoundsView } from "@/lib/probing/load-rounds";
import { NewRound, type RoundActs } from "./NewRound";

type Props = {
  view: RoundsView;
  project: string;
  zone: string;
  may: { probe: boolean; take: boolean };
  acts: RoundActs;
};

/** Rounds of probing of a unit, those in work first; and a new one. */
export function RoundsPlace({ view, project, zone, may, acts }: Props) {
  const { unit, board, rounds, chosen } = view;
  const self = `/projects/${project}/units/${encodeURIComponent(unit.serial)}`;
  const netlists = `/projects/${project}/boards/${encodeURIComponent(board.code)}/netlists`;
  return (
    <Page
      title={
        <>
          {unit.serial}{" "}
          <span className="font-normal text-ink-soft">
            probing, {board.name}, rev {unit.letter}
          </span>
        </>
      }
      lede="Two points a probe: what belongs together beeps, what does not stays silent. A round keeps its netlist and every answer."
      actions={
        <>
          <ButtonLink href={self}>Traveler</ButtonLink>
          <ButtonLink href={netlists}>Netlists</ButtonLink>
        </>
      }
    >
      <div className="flex min-w-0 flex-col gap-5">
        {rounds.length > 0 && (
          <Panel title="Rounds" note={counted(rounds.length, "round")}>
            <ul className="flex flex-col">
              {rounds.map((round) => (
                <RoundRow key={round.id} round={round} {...{ project, self, zone }} mayProbe={may.probe} />
              ))}
            </ul>
          </Panel>
        )}
        {chosen && may.probe && <NewRound key={chosen.id} {...{ project, view, chosen, acts }} />}
        {!chosen && (
          <EmptyState
            title="No netlist to probe from"
            action={
              may.take && (
                <ButtonLink kind="primary" href={netlists}>
                  Take a netlist
                </ButtonLink>
              )
            }
          >
            A round is planned from a netlist of {board.name}: the file that went to the board house, a list of pins, or
            the pin map of this project.
          </EmptyState>
        )}
        {chosen && rounds.length === 0 && !may.probe && (
          <EmptyState title="No round yet">Builders and maintainers start rounds of probing here.</EmptyState>
        )}
      </div>
    </Page>
  );
}

type RowProps = { round: RoundLine; project: string; self: string; zone: string; mayProbe: boolean };

function RoundRow({ round, project, self, zone, mayProbe }: RowProps) {
  const { id, about, netlist, count, probed, by, startedAt, closedAt } = round;
  return (
    <li className="grid items-center gap-x-5 gap-y-2 border-b border-rule py-3 first:pt-0 last:border-b-0 last:pb-0 sm:grid-cols-[minmax(0,1fr)_12rem_auto]">
      <p className="min-w-0">
        <Link href={`${self}/probing/${id}`} className="font-semibold hover:text-copper">
          Netlist {netlist}, {about}
        </Link>
        <span className="block text-sm text-ink-soft">
          {by ?? "somebody"}, <DateTime at={startedAt} zone={zone} form="short" />
          {closedAt && (
            <>
              , closed <DateTime at={closedAt} zone={zone} form="short" />
            </>
          )}
        </span>
      </p>
      <ProgressBar
        label="Probed"
        isLabelHidden={false}
        value={count === 0 ? 0 : probed / count}
        text={`${probed} of ${count}`}
        tone={closedAt ? "passed" : "copper"}
      />
      <div className="flex gap-2 sm:w-40 sm:justify-end">
        {closedAt || !mayProbe ? (
          <ButtonLink size="sm" href={`${self}/probing/${id}`}>
            Look
          </ButtonLink>
        ) : (
          <ButtonLink size="sm" kind="primary" href={`/projects/${project}/probe/${id}`} prefetch={false}>
            {probed === 0 ? "Probe" : "Go on probing"}
          </ButtonLink>
        )}
      </div>
    </li>
  );
}
