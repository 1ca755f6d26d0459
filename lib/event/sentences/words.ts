/** ": because." with a full stop of its own, or a mere full stop. */
export const because = (reason: string) => (reason === "" ? "." : `: ${endSentence(reason)}`);

export const endSentence = (text: string) => (/[.!?…]$/.test(text) ? text : `${text}.`);

export const count = (n: number, word: string) => `${n} ${word}${n === 1 ? "" : "s"}`;

type Gone = { checks: number; attempts: number; files: number; waits: number };

/** What a purge took with it. */
export function whatWent({ checks, attempts, files, waits }: Gone): string {
  const own = `${count(checks, "check")}, ${count(attempts, "attempt")} and ${count(files, "file")} went`;
  return waits === 0 ? own : `${own}, and ${count(waits, "prerequisite")} of other units`;
}
