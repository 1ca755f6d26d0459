import Link from "next/link";
import type { ReactNode } from "react";
import { Page } from "@/components/shell/Page";
import { EmptyState } from "@/components/ui/EmptyState";
import { StageStrip } from "@/components/ui/glyphs/StageStrip";
import { StateGlyph } from "@/components/ui/glyphs/StateGlyph";
import { Panel } from "@/components/ui/Panel";
import type { NextCheck } from "@/lib/check/next-checks";
import type { BenchUnit, BenchView } from "@/lib/traveler/load-bench";
import type { Stage } from "@/db/schema/procedures";
import { STAGES, stageName } from "@/lib/procedure/stages";

type Props = { project: string; bench: BenchView; session: ReactNode };

/** Which unit to lay on the bench: what is next over the whole machine first, then every unit with what waits on it. */
export function BenchPicker({ project, bench, session }: Props) {
  const room = STAGES.map(({ id }) => Math.max(0, ...bench.units.map((unit) => statesOf(unit, id).length)));
  const free = bench.units.filter((unit) => unit.next).length;
  return (
    <Page title="Bench" lede={ledeOf(bench, free)} actions={session}>
      {bench.units.length === 0 ? (
        <EmptyState
          title="No unit to lay on the bench"
          action={
            <Link className="link" href={`/projects/${project}/boards`}>
              To the boards
            </Link>
          }
        >
          Make a unit of a board first. It gets its traveler when the board has an issued procedure.
        </EmptyState>
      ) : (
        <div className="grid gap-5">
          {bench.next.length > 0 && (
            <Panel
              title="Next on the bench"
              padding="none"
              actions={
                <Link className="link text-sm" href={`/projects/${project}/order`}>
                  Plan the evening
                </Link>
              }
            >
              <ol>
                {bench.next.map((check, index) => (
                  <NextLine key={check.checkId} project={project} check={check} isFirst={index === 0} />
                ))}
              </ol>
            </Panel>
          )}
          <Panel title="Units" note={`${bench.units.length}`} padding="none">
            <ul>
              {bench.units.map((unit) => (
                <UnitLine key={unit.serial} project={project} unit={unit} room={room} />
              ))}
            </ul>
          </Panel>
        </div>
      )}
    </Page>
  );
}

function ledeOf({ units, next }: BenchView, free: number): string {
  if (units.length === 0) return "Here one walks a unit's traveler, one check a screen.";
  if (next.length === 0) return "Everything that can be done now holds. What is left waits for something else.";
  return `${free} of ${units.length} units have something to do now.`;
}

const benchHref = (project: string, serial: string, checkId?: string) =>
  `/projects/${project}/bench/${encodeURIComponent(serial)}${checkId ? `?check=${checkId}` : ""}`;

function NextLine({ project, check, isFirst }: { project: string; check: NextCheck; isFirst: boolean }) {
  return (
    <li className="border-rule border-t">
      <Link
        href={benchHref(project, check.serial, check.checkId)}
        prefetch={false}
        className={`hover:bg-copper-ground flex items-center gap-4 px-4 sm:px-5 ${isFirst ? "min-h-20 py-3" : "min-h-14 py-2"}`}
      >
        <StateGlyph state={check.state} label={check.state} size={isFirst ? 20 : 14} />
        <span className="min-w-0 flex-1">
          <span className={isFirst ? "font-head block text-xl leading-tight font-semibold" : "block"}>
            {check.title}
          </span>
          <span className="text-ink-soft text-sm">
            <span className="mono text-ink">{check.serial}</span> · {stageName(check.stage)} · {check.reason}
          </span>
        </span>
        {isFirst && (
          <span className="bg-copper text-on-copper hidden rounded-md px-4 py-3 font-semibold sm:block">Start</span>
        )}
      </Link>
    </li>
  );
}

const statesOf = (unit: BenchUnit, stage: Stage) =>
  unit.checks.filter((check) => check.stage === stage).map((check) => check.state);

function UnitLine({ project, unit, room }: { project: string; unit: BenchUnit; room: readonly number[] }) {
  const groups = STAGES.map(({ id, short }) => ({ name: short, states: statesOf(unit, id) }));
  const hasChecks = unit.checks.length > 0;
  return (
    <li className="border-rule border-t">
      <Link
        href={benchHref(project, unit.serial)}
        prefetch={false}
        className="hover:bg-copper-ground grid items-center gap-x-6 gap-y-2 px-4 py-3 sm:px-5 lg:grid-cols-[24rem_minmax(0,1fr)]"
      >
        <span className="min-w-0">
          <span className="flex flex-wrap items-baseline gap-x-3">
            <span className="mono text-lg font-semibold">{unit.serial}</span>
            <span>
              {unit.board}, rev {unit.letter}
              {unit.slot !== null && `, slot ${unit.slot}`}
            </span>
          </span>
          <span className="text-ink-soft block text-sm">
            {unit.next
              ? `Next: ${unit.next.title}`
              : hasChecks
                ? "Nothing to do now: everything holds or waits."
                : "No traveler yet: its board has no issued procedure."}
          </span>
        </span>
        {hasChecks && (
          <>
            {/* Side by side the strips of all units stand in columns; below one another each takes the room it needs. */}
            <div className="hidden lg:block">
              <StageStrip groups={groups} room={room} />
            </div>
            <div className="lg:hidden">
              <StageStrip groups={groups.filter((group) => group.states.length > 0)} layout="flow" />
            </div>
          </>
        )}
      </Link>
    </li>
  );
}
