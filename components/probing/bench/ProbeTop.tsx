import Link from "next/link";
import clsx from "clsx";
import { Icon } from "@/components/ui/Icon";
import { counted } from "@/components/workshop/counted";
import type { Probing } from "./use-probing";
import { HALVES, type Half } from "./walk";

const HALF_WORDS: Record<Half, string> = { all: "All", first: "First half", second: "Second half" };

type Props = { probing: Probing; serial: string; about: string; roundHref: string };

/** Where one is: unit, how far along, which part of the round, and what is still on this device. */
export function ProbeTop({ probing, serial, about, roundHref }: Props) {
  const { answered, total, wrong, half, changeHalf, results } = probing;
  return (
    <header className="shrink-0 border-b border-rule bg-sheet px-4 pt-[max(0.25rem,env(safe-area-inset-top))] pb-2">
      <div className="mx-auto flex max-w-5xl items-center gap-1">
        <Link
          href={roundHref}
          aria-label={`Leave the bench: round of ${serial}`}
          className="-ml-3 grid size-12 shrink-0 place-items-center rounded hover:bg-copper-ground"
        >
          <Icon name="chevron-left" size={20} />
        </Link>
        <h1 className="min-w-0 flex-1 truncate font-head text-lg min-[360px]:text-xl">
          {serial} <span className="font-normal">· Probing</span>
        </h1>
        <p className="shrink-0 text-sm text-ink-soft">
          <span className="font-semibold text-ink">{answered}</span> of {total}
          {wrong > 0 && <span className="font-semibold text-failed"> · {wrong} not as expected</span>}
        </p>
      </div>
      <div className="mx-auto max-w-5xl">
        <div
          role="progressbar"
          aria-label="Probed"
          aria-valuenow={answered}
          aria-valuemin={0}
          aria-valuemax={total}
          className="h-2 overflow-hidden rounded-sm bg-rule"
        >
          <div
            className="h-full bg-passed transition-[width] duration-200"
            style={{ width: `${total === 0 ? 0 : (100 * answered) / total}%` }}
          />
        </div>
        <div className="mt-2 flex flex-wrap items-center justify-between gap-x-4 gap-y-1">
          <div role="group" aria-label="Which part" className="flex gap-1">
            {HALVES.map((one) => (
              <button
                key={one}
                type="button"
                aria-pressed={half === one}
                onClick={() => changeHalf(one)}
                className={clsx(
                  "min-h-9 rounded px-2.5 text-sm",
                  half === one ? "bg-copper-ground font-semibold text-copper" : "text-ink-soft hover:bg-copper-ground",
                )}
              >
                {HALF_WORDS[one]}
              </button>
            ))}
          </div>
          <p className="truncate text-sm text-ink-soft max-sm:hidden">{about}</p>
        </div>
        {results.heldCount > 0 && (
          <p role="status" className="text-sm font-semibold text-doubtful">
            {counted(results.heldCount, "answer")} on this device. They go out when the network is back.
          </p>
        )}
      </div>
    </header>
  );
}
