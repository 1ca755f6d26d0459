import Link from "next/link";
import { Icon } from "@/components/ui/Icon";
import type { CheckView } from "@/lib/traveler/traveler-view";
import { HeldLine } from "./HeldLine";
import { nextHold } from "./next-check";
import type { QueueState } from "./queue/attempt-queue";
import { RunOfGlyphs } from "./RunOfGlyphs";
import { stageName } from "@/lib/procedure/stages";

type Props = {
  unitHref: string;
  serial: string;
  checks: readonly CheckView[];
  index: number;
  queue: QueueState;
  onOverview: () => void;
  onHeld: () => void;
};

/** Where one is: unit and stage, how far along, what holds ahead, and what is still on this device. */
export function BenchTop({ unitHref, serial, checks, index, queue, onOverview, onHeld }: Props) {
  const current = checks[index];
  const hold = current ? nextHold(checks, current.id) : undefined;
  return (
    <header className="border-rule bg-sheet shrink-0 border-b px-4 pt-[max(0.25rem,env(safe-area-inset-top))] pb-2">
      <div className="mx-auto flex max-w-5xl items-center gap-1">
        <Link
          href={unitHref}
          aria-label={`Leave the bench: traveler of ${serial}`}
          className="hover:bg-copper-ground -ml-3 grid size-12 shrink-0 place-items-center rounded"
        >
          <Icon name="chevron-left" size={20} />
        </Link>
        <h1 className="font-head min-w-0 flex-1 truncate text-lg min-[360px]:text-xl">
          {serial}
          {current && <span className="font-normal"> · {stageName(current.stage)}</span>}
        </h1>
        <p className="text-ink-soft shrink-0 text-sm">
          <span className="max-[359px]:sr-only">check </span>
          <span className="text-ink font-semibold">{index + 1}</span> of {checks.length}
        </p>
      </div>
      <div className="mx-auto max-w-5xl">
        <RunOfGlyphs checks={checks} index={index} onOverview={onOverview} />
        {hold && current && (
          <p className="text-ink-soft truncate text-sm">
            {hold.id === current.id ? (
              <span className="text-ink font-semibold">This is a hold point. Nothing after it before it holds.</span>
            ) : (
              <>
                Next hold point: {hold.number}, {hold.title}
              </>
            )}
          </p>
        )}
        <HeldLine queue={queue} onOpen={onHeld} />
      </div>
    </header>
  );
}
