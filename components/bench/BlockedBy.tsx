import { StateGlyph } from "@/components/ui/glyphs/StateGlyph";
import { Notice } from "@/components/ui/Notice";
import type { CheckView } from "@/lib/traveler/traveler-view";

/** Why the check is not simply free: what it waits for, or why it must be repeated. */
export function BlockedBy({ check }: { check: Pick<CheckView, "state" | "stateReason" | "blockers"> }) {
  if (check.blockers.length > 0) {
    return (
      <Notice kind="waiting" title="It waits. It cannot be recorded yet.">
        <ul className="mt-1 grid gap-1">
          {check.blockers.map((blocker) => (
            <li key={blocker.checkId} className="flex items-center gap-2">
              <StateGlyph state={blocker.state} label={blocker.state} size={12} />
              <span>
                {blocker.serial}: {blocker.title} ({blocker.why})
              </span>
            </li>
          ))}
        </ul>
      </Notice>
    );
  }
  if (check.stateReason === "") return null;
  if (check.state === "reopened" || check.state === "doubtful" || check.state === "conceded") {
    return <Notice kind={check.state}>{check.stateReason}</Notice>;
  }
  return null;
}
