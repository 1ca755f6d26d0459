import { eventPayloads, type EventKind, type EventPayload } from "@/lib/event/schema";

/** What happened to a fault, on its own page: there nobody needs to be told which fault it was. */
export function historyLine(kind: string, payload: unknown, who: string): string {
  const told =
    read("fault.opened", kind, payload, ({ serial }) => `opened it on ${serial}.`) ??
    read("fault.edited", kind, payload, ({ what }) => `wrote down: ${what}.`) ??
    read("fault.stated", kind, payload, ({ from, to }) => `called it ${to}, before ${from}.`);
  return `${who} ${told ?? "changed something."}`;
}

function read<Kind extends EventKind>(
  wanted: Kind,
  kind: string,
  payload: unknown,
  say: (payload: EventPayload<Kind>) => string,
): string | undefined {
  if (kind !== wanted) return undefined;
  const parsed = eventPayloads[wanted].safeParse(payload);
  // The schema of this kind has just read it; the compiler cannot follow the correlation of kind and payload.
  return parsed.success ? say(parsed.data as EventPayload<Kind>) : undefined;
}
