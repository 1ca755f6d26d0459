import type { GatePins } from "@/lib/calc/logic-parts";

/** A pin does one thing. */
export function sayTwice(
  pinout: GatePins[] | null,
  lists: Record<string, number[]>,
  say: (field: string, message: string) => void,
): void {
  const taken = new Map<number, string>();
  const take = (pin: number, what: string, field: string) => {
    const before = taken.get(pin);
    if (before !== undefined) say(field, `Pin ${pin} belongs to ${before} already.`);
    else taken.set(pin, what);
  };
  pinout?.forEach(({ inputs, outputs }, index) =>
    [...inputs, ...outputs].forEach((pin) => take(pin, `gate ${index + 1}`, "gates")),
  );
  const words: Record<string, string> = {
    sharedInputs: "the shared inputs",
    sharedOutputs: "the shared outputs",
    unconnectedPins: "the unconnected pins",
    powerPins: "the supply pins",
    groundPins: "the ground pins",
  };
  for (const [field, pins] of Object.entries(lists)) pins.forEach((pin) => take(pin, words[field] ?? field, field));
}
