"use client";

import Link from "next/link";
import { BlockedBy } from "@/components/bench/BlockedBy";
import { Instruction } from "@/components/bench/Instruction";
import { PinDrawing, type BoardFace } from "@/components/bench/PinDrawing";
import { FaultStateMark } from "@/components/fault/FaultStateMark";
import { EvidenceGallery } from "@/components/evidence/EvidenceGallery";
import { buttonStyle } from "@/components/ui/button-style";
import { DateTime } from "@/components/ui/DateTime";
import { StateWord } from "@/components/ui/glyphs/StateWord";
import { Notice } from "@/components/ui/Notice";
import type { CheckView } from "@/lib/traveler/traveler-view";
import { CheckActs } from "./CheckActs";
import { CheckHistory } from "./CheckHistory";
import { Prerequisites } from "./Prerequisites";
import type { TravelerFrame } from "./traveler-acts";

type Props = { check: CheckView; board: BoardFace; isRetired: boolean; frame: TravelerFrame };

/** The whole of one check: what it asks, how it stands and why, and everything that ever happened to it. */
export function CheckDetail({ check, board, isRetired, frame }: Props) {
  return (
    <div className="grid gap-4 px-5 pt-4 pb-[max(1.5rem,env(safe-area-inset-bottom))]">
      <p className="flex flex-wrap items-center gap-x-3 gap-y-1 text-sm">
        <StateWord state={check.state} />
        <span className="text-ink-soft">
          since <DateTime at={check.stateSince} zone={frame.zone} />
        </span>
        {check.holdPoint && <span className="text-copper font-semibold">hold point</span>}
      </p>
      {isRetired && (
        <Notice kind="waiting">
          This check belongs to an earlier version of the procedure. It is kept for its history and asks for nothing
          more.
        </Notice>
      )}
      {!isRetired && <BlockedBy check={check} />}
      {check.insideGuardBand && (
        <Notice kind="doubtful">
          It conforms inside the guard band only. Repeat it with a better instrument if it matters.
        </Notice>
      )}
      {!isRetired && frame.may.record && check.blockers.length === 0 && (
        <Link
          href={`/projects/${frame.project}/bench/${encodeURIComponent(frame.serial)}?check=${check.id}`}
          prefetch={false}
          className={buttonStyle("primary", "md")}
        >
          Do it at the bench
        </Link>
      )}
      {!isRetired && <CheckActs check={check} frame={frame} />}
      {check.faults.length > 0 && (
        <ul className="grid gap-1 text-sm">
          {check.faults.map(({ number, title, state }) => (
            <li key={number} className="flex flex-wrap items-baseline gap-x-2">
              <Link href={`/projects/${frame.project}/faults/${number}`} className="link" prefetch={false}>
                F{number} {title}
              </Link>
              <FaultStateMark state={state} />
            </li>
          ))}
        </ul>
      )}
      {check.instruction && (
        <div className="[&_p]:text-base">
          <Instruction text={check.instruction} />
        </div>
      )}
      {check.caution && (
        <Notice kind="caution" role="note">
          {check.caution}
        </Notice>
      )}
      <p className="text-sm">
        <span className="text-ink-soft">Conforms: </span>
        <span className="mono font-semibold">{check.expectation}</span>
      </p>
      <PinDrawing pins={check.covers.pins} board={board} />
      <CheckHistory check={check} isRetired={isRetired} frame={frame} />
      {check.evidence.length > 0 && (
        <section>
          <h3 className="mb-2 text-base">Evidence without an attempt</h3>
          <EvidenceGallery
            project={frame.project}
            evidence={check.evidence}
            zone={frame.zone}
            form="strip"
            {...(frame.may.attach ? { actions: frame.acts.evidence } : {})}
          />
        </section>
      )}
      <Prerequisites check={check} frame={frame} canEdit={frame.may.prerequisites && !isRetired} />
      {check.reference && <p className="text-ink-soft text-sm">{check.reference}</p>}
    </div>
  );
}
