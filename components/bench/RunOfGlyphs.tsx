import { MiniGlyph } from "@/components/ui/glyphs/MiniGlyph";
import type { CheckView } from "@/lib/traveler/traveler-view";
import { STAGES } from "@/lib/procedure/stages";

type Props = { checks: readonly CheckView[]; index: number; onOverview: () => void };

/** All checks of the unit as a run of state glyphs, a gap between stages, the open one framed. A touch lists them. */
export function RunOfGlyphs({ checks, index, onOverview }: Props) {
  const held = checks.filter(({ state }) => state === "passed" || state === "conceded").length;
  const open = checks[index]?.id;
  const isShort = checks.length <= 26;
  return (
    <button
      type="button"
      onClick={onOverview}
      aria-label={`${held} of ${checks.length} checks hold. Show all checks`}
      className="hover:bg-copper-ground -mx-1 flex min-h-11 w-[calc(100%+0.5rem)] flex-wrap items-center gap-x-3 gap-y-2 rounded px-1 py-1.5"
    >
      {STAGES.map(({ id: stage }) => {
        const own = checks.filter((check) => check.stage === stage);
        if (own.length === 0) return null;
        return (
          <span
            key={stage}
            className={
              isShort
                ? "flex flex-wrap gap-x-1 gap-y-1.5 [&_svg]:h-4 [&_svg]:w-[9.3px]"
                : "flex flex-wrap gap-x-[3px] gap-y-1.5"
            }
          >
            {own.map((check) => (
              <MiniGlyph key={check.id} state={check.state} isMarked={check.id === open} />
            ))}
          </span>
        );
      })}
    </button>
  );
}
