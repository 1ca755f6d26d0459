import clsx from "clsx";
import { StateGlyph } from "@/components/ui/glyphs/StateGlyph";
import type { CheckView } from "@/lib/traveler/traveler-view";
import { BottomSheet } from "./BottomSheet";
import { STAGES, stageName } from "@/lib/procedure/stages";

type Props = {
  checks: readonly CheckView[];
  openId: string | undefined;
  onOpen: (id: string) => void;
  onClose: () => void;
};

/** Every check of the unit by stage; a touch opens it. */
export function OverviewSheet({ checks, openId, onOpen, onClose }: Props) {
  return (
    <BottomSheet title="All checks" onClose={onClose}>
      {STAGES.map(({ id: stage }) => {
        const own = checks.filter((check) => check.stage === stage);
        if (own.length === 0) return null;
        const held = own.filter(({ state }) => state === "passed" || state === "conceded").length;
        return (
          <section key={stage} className="mb-4">
            <h3 className="flex items-baseline gap-2 text-base">
              {stageName(stage)}
              <span className="text-ink-soft font-text text-sm font-normal">
                {held} of {own.length} hold
              </span>
            </h3>
            <ul>
              {own.map((check) => (
                <li key={check.id}>
                  <button
                    type="button"
                    aria-current={check.id === openId ? "step" : undefined}
                    onClick={() => onOpen(check.id)}
                    className={clsx(
                      "border-rule flex min-h-14 w-full items-center gap-3 border-b px-1 py-2 text-left leading-snug",
                      check.id === openId && "bg-copper-ground",
                    )}
                  >
                    <StateGlyph state={check.state} label={check.state} size={16} />
                    <span className="mono text-ink-soft w-6 shrink-0 text-sm">{check.number}</span>
                    <span className="min-w-0 flex-1">
                      {check.title}
                      {check.holdPoint && <span className="text-copper block text-sm font-semibold">Hold point</span>}
                    </span>
                    <span className="text-ink-soft text-sm">{check.state}</span>
                  </button>
                </li>
              ))}
            </ul>
          </section>
        );
      })}
    </BottomSheet>
  );
}
