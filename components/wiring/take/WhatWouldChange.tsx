"use client";

import { Badge } from "@/components/ui/Badge";
import { Panel } from "@/components/ui/Panel";
import { RadioGroup } from "@/components/ui/RadioGroup";
import type { Tone } from "@/components/ui/tone";
import { Disclosure } from "@/components/workshop/Disclosure";
import { counted } from "@/components/workshop/counted";
import { nameOf } from "@/lib/pin-map-file/resolve-target";
import type { PinChange, TargetPlan, Unnamed } from "@/lib/pin-map-file/plan-take";
import { PIN_COLUMNS, type PinTexts } from "@/lib/pin-map/pin-columns";
import type { TakeRead } from "./use-take-state";

const UNNAMED = [
  { id: "keep", label: "Stay as they are" },
  { id: "clear", label: "Are cleared, on the connectors that the file names" },
];

const TONES: Record<PinChange["kind"], Tone> = { added: "passed", changed: "doubtful", cleared: "failed" };
const MOST = 200;

type Props = { read: TakeRead; unnamed: Unnamed; onUnnamed: (unnamed: Unnamed) => void };

/** Connector by connector, pin by pin: what is there, and what would be. */
export function WhatWouldChange({ read: { plan }, unnamed, onUnnamed }: Props) {
  const { targets, added, changed, cleared, unchanged } = plan;
  const note = [
    added > 0 ? `${added} added` : "",
    changed > 0 ? `${changed} changed` : "",
    cleared > 0 ? `${cleared} cleared` : "",
    `${unchanged} as ${unchanged === 1 ? "it is" : "they are"}`,
  ].filter((part) => part !== "");
  return (
    <Panel title="What would change" note={note.join(", ")}>
      <RadioGroup
        label="Pins that the file does not name"
        isInRow
        options={UNNAMED}
        value={unnamed}
        onChange={(id) => onUnnamed(id === "clear" ? "clear" : "keep")}
      />
      <div className="mt-3 flex flex-col">
        {targets.map((target) => (
          <TargetChanges key={target.target.id} plan={target} isOpen={targets.length === 1} />
        ))}
      </div>
    </Panel>
  );
}

function TargetChanges({ plan: { target, changes, unchanged }, isOpen }: { plan: TargetPlan; isOpen: boolean }) {
  const shown = changes.slice(0, MOST);
  return (
    <section className="border-t border-rule py-1">
      <Disclosure
        isOpen={isOpen}
        summary={
          <>
            <span className="mono font-semibold text-ink">{nameOf(target)}</span>
            <span>
              {changes.length === 0 ? "nothing changes" : counted(changes.length, "pin changes", "pins change")}
              {unchanged > 0 && `, ${unchanged} stay`}
            </span>
          </>
        }
      >
        {changes.length > 0 && (
          <table className="mb-3 w-full border-collapse text-left text-sm">
            <thead className="text-ink-soft">
              <tr>
                <th scope="col" className="py-1 pr-3 font-semibold">
                  Pin
                </th>
                <th scope="col" className="px-3 font-semibold">
                  <span className="sr-only">What happens</span>
                </th>
                <th scope="col" className="px-3 font-semibold">
                  Would be
                </th>
                <th scope="col" className="px-3 font-semibold max-sm:hidden">
                  Is now
                </th>
              </tr>
            </thead>
            <tbody>
              {shown.map((change) => (
                <ChangeRow key={change.pin} change={change} />
              ))}
            </tbody>
          </table>
        )}
        {changes.length > shown.length && (
          <p className="pb-2 text-sm text-ink-soft">and {changes.length - shown.length} more pins</p>
        )}
      </Disclosure>
    </section>
  );
}

function ChangeRow({ change: { pin, kind, before, after } }: { change: PinChange }) {
  return (
    <tr className="border-t border-rule align-baseline">
      <th scope="row" className="mono py-1.5 pr-3 font-semibold">
        {pin}
      </th>
      <td className="px-3 py-1.5">
        <Badge tone={TONES[kind]}>{kind}</Badge>
      </td>
      <td className="px-3 py-1.5">
        <Row texts={after} />
        {kind !== "added" && (
          <span className="block text-xs text-ink-soft sm:hidden">
            now <Row texts={before} />
          </span>
        )}
      </td>
      <td className="px-3 py-1.5 text-ink-soft max-sm:hidden">
        <Row texts={before} />
      </td>
    </tr>
  );
}

function Row({ texts }: { texts: PinTexts }) {
  const [signal, ...rest] = PIN_COLUMNS.map((column) => texts[column]).map((text, at) =>
    PIN_COLUMNS[at] === "loads" && text !== "" ? `${text} loads` : text,
  );
  const others = rest.filter((text) => text !== "").join(", ");
  if (!signal && others === "") return <span className="text-ink-faint">nothing</span>;
  return (
    <>
      <span className="mono font-semibold">{signal}</span> {others}
    </>
  );
}
