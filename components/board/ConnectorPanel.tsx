"use client";

import Link from "next/link";
import { useState, type KeyboardEvent } from "react";
import { ConnectorFace } from "@/components/ui/glyphs/ConnectorFace";
import { Panel } from "@/components/ui/Panel";
import type { BoardView } from "@/lib/board/load-board";
import { faceOf } from "@/lib/calc/connector";

type Props = {
  board: Pick<BoardView, "code" | "connectorType" | "connectorGrid" | "connectorReference" | "covered" | "issued">;
  project: string;
};

const STEPS: Record<string, number> = { ArrowRight: 1, ArrowDown: 1, ArrowLeft: -1, ArrowUp: -1 };

/** The connector as it is; lit are the pins that checks of the procedure cover, and each says by which. */
export function ConnectorPanel({ board, project }: Props) {
  const { covered, connectorReference: reference } = board;
  const [shown, setShown] = useState<string>();
  const connector = faceOf({ type: board.connectorType ?? "", grid: board.connectorGrid });
  if (!connector) return null;
  const at = covered.findIndex(({ pin }) => pin === shown);
  const one = covered[at];

  function walk(event: KeyboardEvent) {
    const step = STEPS[event.key];
    if (step === undefined || covered.length === 0) return;
    event.preventDefault();
    const next = at < 0 ? (step > 0 ? 0 : -1) : at + step;
    setShown(covered.at(next % covered.length)?.pin);
  }

  return (
    <Panel
      title={`Connector ${reference}`}
      note={`checks cover ${covered.length} of ${connector.pins.length} pins`}
      actions={
        <Link
          href={`/projects/${project}/wiring?connector=${encodeURIComponent(`${board.code}.${reference}`)}`}
          className="link text-sm font-semibold"
        >
          Its pin map
        </Link>
      }
    >
      <div className="flex flex-wrap items-center gap-x-6 gap-y-2">
        <div
          role="group"
          tabIndex={covered.length > 0 ? 0 : undefined}
          aria-label={`Covered pins of ${reference}; the arrow keys walk from one to the next`}
          onKeyDown={walk}
          onFocus={() => setShown((before) => before ?? covered[0]?.pin)}
          onPointerLeave={() => setShown(undefined)}
          className="grid-paper w-fit max-w-full rounded-md border border-rule px-3 py-2"
        >
          <ConnectorFace
            face={connector}
            lit={new Set(covered.map(({ pin }) => pin))}
            marked={one?.pin}
            onPin={setShown}
            label={`Connector ${reference}`}
          />
        </div>
        <p aria-live="polite" className="min-h-10 min-w-48 flex-1 text-sm text-ink-soft">
          {one ? (
            <>
              <span className="mono mr-2 font-semibold text-ink">{one.pin}</span>
              {one.checks.join(" · ")}
            </>
          ) : covered.length > 0 ? (
            "Point at a lit pin, or walk with the arrow keys, to see which checks cover it."
          ) : board.issued ? (
            "No check of the procedure names a pin of it. Name them in the procedure and they light up here and on the bench."
          ) : (
            "Pins light up once a procedure is issued whose checks name them."
          )}
        </p>
      </div>
    </Panel>
  );
}
