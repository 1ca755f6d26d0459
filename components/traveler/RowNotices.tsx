import type { CheckView } from "@/lib/traveler/traveler-view";
import { Notice } from "@/components/ui/Notice";

/** Why the row stands as it does, under the row: doubt, reopening, concession, a lifted hold. */
export function RowNotices({ check }: { check: CheckView }) {
  const standing = check.concessions.find((concession) => !concession.withdrawn);
  const speaks = check.state === "reopened" || check.state === "doubtful" || check.state === "conceded";
  const reason = check.stateReason || (check.state === "conceded" && standing ? `Conceded: ${standing.reason}` : "");
  const lift = check.holdLifts[0];
  if (!(speaks && reason) && !lift) return null;
  return (
    <div className="grid gap-2 pr-4 pb-3 pl-14 sm:pr-5 sm:pl-16">
      {speaks && reason && (
        <Notice kind={check.state === "reopened" || check.state === "doubtful" ? check.state : "conceded"}>
          {reason}
        </Notice>
      )}
      {lift && (
        <Notice kind="caution" role="note">
          Hold lifted for this unit by {lift.by.name}: {lift.reason}
        </Notice>
      )}
    </div>
  );
}
