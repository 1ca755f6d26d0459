import clsx from "clsx";
import { StateGlyph } from "@/components/ui/glyphs/StateGlyph";
import { HIT_KINDS, type SearchHit } from "@/lib/search/schema";

const HEADINGS: Record<SearchHit["kind"], string> = {
  board: "Boards",
  unit: "Units",
  check: "Checks",
  signal: "Signals, pins and rails",
  fault: "Faults",
  log: "Log",
};

export function groupHits(hits: readonly SearchHit[]) {
  return HIT_KINDS.map((kind) => ({
    kind,
    heading: HEADINGS[kind],
    hits: hits.filter((hit) => hit.kind === kind),
  })).filter((group) => group.hits.length > 0);
}

/** One result: what it is called, where it belongs. */
export function HitLine({ hit }: { hit: SearchHit }) {
  const isName = hit.kind === "unit" || hit.kind === "signal";
  return (
    <span className="grid min-w-0 grid-cols-[1.5rem_minmax(0,1fr)] items-baseline gap-x-2.5">
      <span className="flex justify-center self-center">
        {hit.state ? (
          <StateGlyph state={hit.state} size={13} label={hit.state} />
        ) : (
          <span className="size-1 rounded-full bg-ink-faint" />
        )}
      </span>
      <span className="flex min-w-0 flex-wrap items-baseline gap-x-3">
        <span className={clsx("font-semibold", isName && "mono text-sm")}>{hit.title}</span>
        <span className="min-w-0 truncate text-sm text-ink-soft">{hit.detail}</span>
      </span>
    </span>
  );
}
