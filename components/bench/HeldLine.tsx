import { Icon } from "@/components/ui/Icon";
import type { QueueState } from "./queue/attempt-queue";

/** What the line says, or undefined when nothing is worth a line. */
export function heldSentence({
  held,
  signedOut,
  sending,
}: QueueState): { text: string; follows: string; wrong: boolean } | undefined {
  const refused = held.filter((attempt) => attempt.trouble?.kind === "refused").length;
  const waiting = held.length - refused;
  if (refused > 0) {
    const what = refused === 1 ? "One was not recorded" : `${refused} were not recorded`;
    return { text: `Held on this device (${held.length}).`, follows: `${what}: look at it.`, wrong: true };
  }
  if (waiting === 0) return undefined;
  if (signedOut)
    return {
      text: `Held on this device (${waiting}).`,
      follows: "You are signed out. Sign in and they go out.",
      wrong: true,
    };
  const stuck = held.some((attempt) => attempt.trouble?.kind === "waiting");
  if (!stuck)
    return sending
      ? { text: "Sending.", follows: waiting > 1 ? `${waiting} on the way.` : "", wrong: false }
      : undefined;
  return {
    text: `Held on this device (${waiting}).`,
    follows: waiting === 1 ? "It goes out by itself." : "They go out by themselves, in order.",
    wrong: false,
  };
}

export function HeldLine({ queue, onOpen }: { queue: QueueState; onOpen: () => void }) {
  const said = heldSentence(queue);
  return (
    <div role="status" className="empty:hidden">
      {said && (
        <button
          type="button"
          onClick={onOpen}
          className={`-mx-1 flex min-h-11 w-[calc(100%+0.5rem)] items-center gap-2 rounded px-1 text-left text-sm leading-tight ${said.wrong ? "text-failed" : "text-doubtful"}`}
        >
          <span className="flex-1">
            <span className="font-semibold">{said.text}</span> {said.follows}
          </span>
          <Icon name="chevron-right" />
        </button>
      )}
    </div>
  );
}
