"use client";

import Link from "next/link";
import { useAct } from "@/components/board/use-act";
import { ReasonDialog } from "@/components/traveler/ReasonDialog";
import { Button } from "@/components/ui/Button";
import { DateTime } from "@/components/ui/DateTime";
import { Icon } from "@/components/ui/Icon";
import type { PunchItemView } from "@/lib/punch/load-punch";
import type { PunchActs } from "./punch-acts";

type Props = {
  project: string;
  zone: string;
  item: PunchItemView;
  canEdit: boolean;
  acts: PunchActs;
};

const SOURCES = { fault: "Fault", concession: "Concession", rework: "Rework" } as const;

export function PunchLine({ project, zone, item, canEdit, acts }: Props) {
  const { act, isPending } = useAct();
  const { id: itemId, version, dealtWith, dealt } = item;
  const isDone = dealtWith !== "";
  const write = (writeId: string) => ({ project, writeId, itemId, version });
  return (
    <li className="grid grid-cols-[1.5rem_minmax(0,1fr)] items-start gap-x-3 py-3 sm:grid-cols-[1.5rem_minmax(0,1fr)_auto]">
      <span
        className="mt-0.5 flex size-5 items-center justify-center rounded-sm border border-edge bg-raised text-passed"
        role="img"
        aria-label={isDone ? "dealt with" : "open"}
      >
        {isDone && <Icon name="check" size={14} />}
      </span>
      <div className="min-w-0">
        <p className={isDone ? "text-ink-soft" : undefined}>{item.text}</p>
        <p className="text-ink-soft text-sm">
          <Source {...{ project, item }} />
        </p>
        {dealt && (
          <p className="mt-1 text-sm">
            <span className="font-semibold">{dealtWith}</span>{" "}
            <span className="text-ink-soft">
              {dealt.by}, <DateTime at={dealt.at} zone={zone} form="short" />
            </span>
          </p>
        )}
      </div>
      {canEdit && (
        <span className="max-sm:col-start-2 max-sm:mt-2">
          {isDone ? (
            <Button
              size="sm"
              kind="quiet"
              isPending={isPending}
              aria-label={`Put “${item.text}” back on the list`}
              onPress={() =>
                void act(
                  () => acts.reopen(write(crypto.randomUUID())),
                  () => "It is back on the list.",
                )
              }
            >
              Put it back
            </Button>
          ) : (
            <ReasonDialog
              title="Dealt with?"
              trigger={
                <Button size="sm" aria-label={`Tick off “${item.text}”`}>
                  Tick off
                </Button>
              }
              explanation={item.text}
              label="How it was dealt with in this revision"
              submitLabel="Tick it off"
              said="Ticked off."
              send={(how, writeId) => acts.deal({ ...write(writeId), how })}
            />
          )}
        </span>
      )}
    </li>
  );
}

/** Where it comes from; what was purged is named without a way to it. */
function Source({ project, item }: { project: string; item: PunchItemView }) {
  const { source, serial, fault, rework, mark } = item;
  const base = `/projects/${project}`;
  const unit = serial === null ? undefined : `${base}/units/${encodeURIComponent(serial)}`;
  const href =
    fault !== null ? `${base}/faults/${fault}` : rework !== null && unit ? `${unit}/reworks#R${rework}` : unit;
  const words = [SOURCES[source], mark].filter(Boolean).join(" ");
  const where = serial === null ? "of a unit that is gone" : `of ${serial}`;
  if (!href)
    return (
      <>
        {words} {where}
      </>
    );
  return (
    <Link href={href} className="link" prefetch={false}>
      {words} {where}
    </Link>
  );
}
