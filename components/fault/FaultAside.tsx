import Link from "next/link";
import { Fragment } from "react";
import { PinDrawing, type BoardFace } from "@/components/bench/PinDrawing";
import { DateTime } from "@/components/ui/DateTime";
import { StateGlyph } from "@/components/ui/glyphs/StateGlyph";
import { StateWord } from "@/components/ui/glyphs/StateWord";
import { Panel } from "@/components/ui/Panel";
import { writeHours } from "@/lib/fault/fault-words";
import type { FaultView } from "@/lib/fault/load-fault";

type Props = { project: string; zone: string; fault: FaultView; face: BoardFace };

/** What hangs on a fault: where it shows, the attempts, the reworks made for it, its history. */
export function FaultAside({ project, zone, fault, face }: Props) {
  const unit = `/projects/${project}/units/${encodeURIComponent(fault.unit.serial)}`;
  const { check, signals, pins } = fault;
  return (
    <>
      <Panel title="Where it shows" level={3}>
        <div className="grid gap-2.5 text-[0.9375rem]">
          <p>
            <Link href={unit} className="link mono text-sm font-semibold" prefetch={false}>
              {fault.unit.serial}
            </Link>
          </p>
          {check && (
            <p>
              <Link href={`${unit}?check=${check.id}#check-${check.id}`} className="link" prefetch={false}>
                {check.title}
              </Link>{" "}
              <StateWord state={check.state} size="sm" />
            </p>
          )}
          {fault.probePlanId && (
            <p>
              <Link href={`${unit}/probing/${fault.probePlanId}`} className="link" prefetch={false}>
                The round of probing that found it
              </Link>
            </p>
          )}
          {signals.length > 0 && (
            <p className="mono text-sm">
              {signals.map((name, index) => (
                <Fragment key={name}>
                  {index > 0 && ", "}
                  <Link
                    href={`/projects/${project}/wiring/nets?net=${encodeURIComponent(name)}`}
                    className="link"
                    prefetch={false}
                  >
                    {name}
                  </Link>
                </Fragment>
              ))}
            </p>
          )}
          <PinDrawing pins={pins} board={face} />
          {fault.hours !== null && <p className="text-ink-soft">It cost {writeHours(fault.hours)}.</p>}
        </div>
      </Panel>
      {fault.attempts.length > 0 && (
        <Panel title="Attempts" level={3}>
          <ul className="grid gap-2.5">
            {fault.attempts.map((attempt) => (
              <li key={attempt.id} className="grid grid-cols-[1.75rem_minmax(0,1fr)] gap-x-1.5 text-sm">
                <StateGlyph
                  state={attempt.verdict === "does-not-conform" ? "failed" : "passed"}
                  label={attempt.verdict === "does-not-conform" ? "does not conform" : "conforms"}
                  size={13}
                  className="mt-1"
                />
                <div className="min-w-0">
                  <p className="mono font-semibold">
                    {attempt.summary}
                    {attempt.id === fault.attemptId && (
                      <span className="text-ink-soft font-text font-normal">, showed it</span>
                    )}
                  </p>
                  {attempt.note && <p>{attempt.note}</p>}
                  <p className="text-ink-soft">
                    {attempt.by}, <DateTime at={attempt.at} zone={zone} form="short" />
                  </p>
                </div>
              </li>
            ))}
          </ul>
        </Panel>
      )}
      {fault.reworks.length > 0 && (
        <Panel title="Reworks" level={3}>
          <ul className="grid gap-2.5 text-sm">
            {fault.reworks.map((rework) => (
              <li key={rework.id}>
                <Link
                  href={`/projects/${project}/units/${encodeURIComponent(rework.serial)}/reworks#R${rework.number}`}
                  className="link font-semibold"
                  prefetch={false}
                >
                  {rework.title}
                </Link>{" "}
                on {rework.serial}
                <p>{rework.says}</p>
                <p className="text-ink-soft">
                  {rework.by}, <DateTime at={rework.at} zone={zone} form="short" />
                </p>
              </li>
            ))}
          </ul>
        </Panel>
      )}
      <Panel title="History" level={3}>
        <ol className="grid gap-2 text-sm">
          {fault.history.map((event) => (
            <li key={event.id}>
              {event.sentence}
              <DateTime at={event.at} zone={zone} form="short" className="text-ink-soft block" />
            </li>
          ))}
        </ol>
      </Panel>
    </>
  );
}
