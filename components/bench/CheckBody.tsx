import type { ReactNode } from "react";
import { Icon } from "@/components/ui/Icon";
import { Notice } from "@/components/ui/Notice";
import type { CheckView } from "@/lib/traveler/traveler-view";
import { BlockedBy } from "./BlockedBy";
import { Instruction } from "./Instruction";
import { PinDrawing, type BoardFace } from "./PinDrawing";

type Props = {
  check: Pick<
    CheckView,
    | "title"
    | "instruction"
    | "caution"
    | "reference"
    | "expectation"
    | "holdPoint"
    | "covers"
    | "state"
    | "stateReason"
    | "blockers"
  >;
  board: BoardFace;
  expected: string | undefined;
  /** Word beside the limits, by the kind: readings have limits, statements say what one should find. */
  measured: boolean;
  children?: ReactNode;
};

/** What to do and what to expect, in type that reads at arm's length; the caution stands where the step does. */
export function CheckBody({ check, board, expected, measured, children }: Props) {
  return (
    <div className="grid gap-4">
      <div>
        {check.holdPoint && (
          <p className="text-copper mb-1 flex items-center gap-1.5 text-sm font-semibold">
            <Icon name="minus" /> Hold point
          </p>
        )}
        <h2 tabIndex={-1} id="check-title" className="text-2xl outline-none sm:text-3xl">
          {check.title}
        </h2>
      </div>
      <BlockedBy check={check} />
      {check.instruction && <Instruction text={check.instruction} />}
      {check.caution && (
        <Notice kind="caution" role="note" className="text-lg">
          {check.caution}
        </Notice>
      )}
      <Expectation expected={expected} expectation={check.expectation} measured={measured} />
      <PinDrawing pins={check.covers.pins} board={board} />
      <Covered check={check} />
      {check.reference && <p className="text-ink-soft text-sm">{check.reference}</p>}
      {children}
    </div>
  );
}

function Expectation({
  expected,
  expectation,
  measured,
}: {
  expected: string | undefined;
  expectation: string;
  measured: boolean;
}) {
  const boxes = measured
    ? [
        { name: "Expected", value: expected },
        { name: "Conforms", value: expectation },
      ]
    : [{ name: "Should show", value: expected ?? expectation }];
  const shown = boxes.filter((box) => box.value);
  if (shown.length === 0) return null;
  return (
    <dl className="border-rule bg-raised divide-rule flex flex-wrap divide-x rounded-md border">
      {shown.map(({ name, value }) => (
        <div key={name} className="min-w-24 flex-auto px-4 py-2.5">
          <dt className="text-ink-soft text-sm">{name}</dt>
          <dd className={measured ? "mono text-xl font-semibold" : "text-lg"}>{value}</dd>
        </div>
      ))}
    </dl>
  );
}

function Covered({ check }: Pick<Props, "check">) {
  const { signals, rails, blocks } = check.covers;
  const named = [...rails, ...signals, ...blocks];
  if (named.length === 0) return null;
  return (
    <p className="text-ink-soft flex flex-wrap gap-x-3 gap-y-1 text-sm">
      Covers
      {named.map((name) => (
        <span key={name} className="mono text-ink">
          {name}
        </span>
      ))}
    </p>
  );
}
