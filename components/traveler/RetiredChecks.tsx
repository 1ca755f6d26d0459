import type { CheckView } from "@/lib/traveler/traveler-view";
import { CheckRow } from "./CheckRow";
import type { TravelerFrame } from "./traveler-acts";

type Props = {
  checks: readonly CheckView[];
  openId: string | undefined;
  onOpen: (id: string) => void;
  frame: TravelerFrame;
};

/** Checks of earlier versions of the procedure, out of use but not out of the record. */
export function RetiredChecks({ checks, openId, onOpen, frame }: Props) {
  if (checks.length === 0) return null;
  return (
    <details className="mt-5" open={checks.some((check) => check.id === openId)}>
      <summary className="text-ink-soft min-h-10 py-2 font-semibold">
        {checks.length === 1 ? "One check" : `${checks.length} checks`} of earlier procedure versions
      </summary>
      <ul className="border-rule bg-sheet mt-1 rounded-lg border">
        {checks.map((check) => (
          <CheckRow
            key={check.id}
            check={check}
            isOpen={check.id === openId}
            onOpen={onOpen}
            zone={frame.zone}
            rule={frame.rule}
          />
        ))}
      </ul>
    </details>
  );
}
