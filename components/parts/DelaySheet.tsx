"use client";

import Link from "next/link";
import type { OfferAct } from "@/components/offer/offer-acts";
import { OfferToCheck } from "@/components/offer/OfferToCheck";
import { Button } from "@/components/ui/Button";
import { Notice } from "@/components/ui/Notice";
import { Panel } from "@/components/ui/Panel";
import type { DelayPathLine, DelayView } from "@/lib/delay-path/load-delay-paths";
import { windowLimits } from "@/lib/delay-path/window-limits";
import type { OfferPlace } from "@/lib/offer/schema";
import { workOut } from "@/lib/delay-path/work-out";
import { DelayResult } from "./DelayResult";

type Props = {
  project: string;
  view: DelayView;
  line: DelayPathLine;
  can: { edit: boolean; editProcedure: boolean };
  offer: OfferAct;
  onEdit: () => void;
  onArchive: () => void;
};

/** One path with what it comes to, and where its window may go. */
export function DelaySheet({ project, view, line, can, offer, onEdit, onArchive }: Props) {
  const worked = workOut(line.path, view);
  const limits = worked.ok ? windowLimits(worked.window) : undefined;
  const place = view.places.find(({ board }) => board === line.board);
  const measure = line.path.measure || `Delay of ${line.name}`;
  return (
    <Panel
      title={line.name}
      note={
        line.board && (
          <Link href={`/projects/${project}/parts/boards/${line.board}`} className="mono hover:text-copper">
            {line.board}
          </Link>
        )
      }
      actions={
        can.edit && (
          <>
            <Button size="sm" aria-label={`Change ${line.name}`} onPress={onEdit}>
              Change
            </Button>
            <Button size="sm" kind="quiet" aria-label={`Archive ${line.name}`} onPress={onArchive}>
              Archive
            </Button>
          </>
        )
      }
    >
      <div className="flex flex-col gap-5">
        {worked.ok ? (
          <DelayResult worked={worked} />
        ) : (
          <Notice kind="failed" role="status">
            {worked.message}
          </Notice>
        )}
        {limits && (
          <section
            aria-label={`Hand the window of ${line.name} to a capture check`}
            className="rounded border border-rule bg-raised px-4 py-3 print:hidden"
          >
            <h3 className="mb-2 text-base">Hand the window to a capture check</h3>
            {place ? (
              <OfferToCheck
                key={`${place.board} ${limits}`}
                project={project}
                place={likelyFirst(place, measure)}
                fields={[
                  { field: "windowOf", name: "Measured", text: measure },
                  { field: "window", name: "Within", text: limits },
                ]}
                caution={null}
                fresh={freshCheck(line.name, measure, limits)}
                canEdit={can.editProcedure}
                act={offer}
              />
            ) : (
              <p className="text-[0.9375rem] text-ink-soft">
                Say on which board the path is measured; then its window can go into a capture check of that board.
              </p>
            )}
          </section>
        )}
      </div>
    </Panel>
  );
}

/** A check that measures the same stands first, so that it is the one that is offered. */
const likelyFirst = (place: OfferPlace, measure: string): OfferPlace => ({
  ...place,
  checks: [...place.checks].sort(
    (one, other) => Number(other.typed.windowOf === measure) - Number(one.typed.windowOf === measure),
  ),
});

const freshCheck = (name: string, windowOf: string, window: string) => ({
  stage: "function" as const,
  title: `Delay: ${name}`.slice(0, 200),
  instruction: "",
  caution: "",
  reference: "",
  holdPoint: false,
  kind: "capture" as const,
  typed: { expects: "", windowOf, window },
  covers: { signals: [], pins: [], rails: [], blocks: [] },
  needs: [],
});
