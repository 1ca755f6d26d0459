"use client";

import clsx from "clsx";
import Link from "next/link";
import { memo, type ReactNode } from "react";
import { Button } from "@/components/ui/Button";
import type { Edit, PinAt } from "@/lib/calc/interconnect";
import type { FindingView } from "@/lib/finding/load-findings";
import { canBeDoneHere } from "../editor/edit-changes";
import { WEIGHT_WORDS, WeightMark } from "../WeightMark";
import { placeWords } from "./net-words";
import type { ShownFinding } from "./shown-findings";

export type AcceptOf = ((finding: FindingView) => ReactNode) | undefined;

type Props = {
  project: string;
  finding: ShownFinding;
  /** Touches the pin one is at. */
  isAtPin: boolean;
  canEdit: boolean;
  hasSeveral: (board: string) => boolean;
  /** The button that accepts it, for those who may. */
  acceptOf: AcceptOf;
  onJump: (pin: PinAt) => void;
  onDo: (finding: ShownFinding) => void;
};

const FEW = 4;

/** One finding beside the table: what, why, what mends it, and the way to its pins. Not drawn anew while one moves. */
export const FindingLine = memo(function FindingLine({
  project,
  finding,
  isAtPin,
  canEdit,
  hasSeveral,
  acceptOf,
  onJump,
  onDo,
}: Props) {
  const { weight, title, why, mend, pins, edits, accepted } = finding;
  const [first] = pins;
  const accept = accepted || !finding.stored ? null : acceptOf?.(finding.stored);
  const places = [...new Map(pins.map((pin) => [`${pin.connectorId} ${pin.pin}`, pin])).values()];
  return (
    <li className={clsx("flex gap-3 px-4 py-3 sm:px-5", isAtPin && "bg-copper-ground/60")}>
      <WeightMark weight={weight} className={clsx("mt-1", accepted && "text-ink-faint!")} />
      <div className="flex min-w-0 flex-1 flex-col gap-1">
        <h3 className="text-base leading-snug">
          <span className="sr-only">{WEIGHT_WORDS[weight]}: </span>
          {first ? (
            <button type="button" onClick={() => onJump(first)} className="text-left hover:text-copper">
              {title}
            </button>
          ) : (
            title
          )}
        </h3>
        {accepted ? (
          <p className="text-sm text-ink-soft">
            Accepted by {accepted.by}: {accepted.reason}
          </p>
        ) : (
          <p className="text-pretty text-sm text-ink-soft">
            {why} <span className="text-ink">{mend}</span>
          </p>
        )}
        {places.length > 1 && (
          <p className="flex flex-wrap gap-1">
            {places.slice(0, FEW).map((pin) => (
              <button
                key={`${pin.connectorId} ${pin.pin}`}
                type="button"
                onClick={() => onJump(pin)}
                className="mono rounded-sm border border-rule-strong bg-raised px-1.5 py-0.5 text-2xs hover:border-copper hover:text-copper"
              >
                {placeWords(pin, hasSeveral)} <b className="font-semibold">{pin.pin}</b>
              </button>
            ))}
            {places.length > FEW && <span className="text-xs text-ink-soft">and {places.length - FEW} more</span>}
          </p>
        )}
        {!accepted && (canEdit || accept) && (
          <p className="mt-0.5 flex flex-wrap items-center gap-2">
            {canEdit && canBeDoneHere(edits) && (
              <Button size="sm" onPress={() => onDo(finding)} aria-label={`Do this: ${mend}`}>
                Do this
              </Button>
            )}
            {canEdit &&
              !canBeDoneHere(edits) &&
              edits.map((edit) => <Elsewhere key={JSON.stringify(edit)} project={project} edit={edit} />)}
            {accept}
          </p>
        )}
      </div>
    </li>
  );
});

/** What mends it stands in another place. */
function Elsewhere({ project, edit }: { project: string; edit: Edit }) {
  const look = "link text-sm font-semibold";
  if (edit.kind === "alias") {
    return (
      <Link href={`/projects/${project}/wiring/signals`} className={look}>
        Say that {edit.alias} is {edit.signal}
      </Link>
    );
  }
  if (edit.kind === "tie-spares") {
    return (
      <Link href={`/projects/${project}/parts/boards/${edit.board}`} className={look}>
        Tie the spares of {edit.board}
      </Link>
    );
  }
  return null;
}
