import type { LogicPart } from "@/lib/calc/logic-parts";

export type PinRole = {
  pin: number;
  kind: "in" | "out" | "power" | "ground" | "none";
  /** "A in", "all in", "supply". */
  text: string;
  /** Letter of the gate; undefined for what all gates share and for the supply. */
  gate?: string;
};

/** A … Z, then by number, as packing letters them. */
export const gateLetter = (index: number): string => (index < 26 ? String.fromCharCode(65 + index) : String(index + 1));

/** What each pin of a package does, by number; pins of which nothing is known are left open. */
export function pinRoles(part: LogicPart): PinRole[] {
  const roles = new Map<number, PinRole>();
  const say = (pins: readonly number[], role: Omit<PinRole, "pin">) =>
    pins.forEach((pin) => roles.set(pin, { pin, ...role }));
  say(part.powerPins, { kind: "power", text: "supply" });
  say(part.groundPins, { kind: "ground", text: "ground" });
  say(part.unconnectedPins, { kind: "none", text: "nothing" });
  say(part.sharedInputs, { kind: "in", text: "all in" });
  say(part.sharedOutputs, { kind: "out", text: "all out" });
  const isOne = part.pinout?.length === 1;
  part.pinout?.forEach(({ inputs, outputs }, index) => {
    const gate = gateLetter(index);
    say(inputs, { kind: "in", text: isOne ? "in" : `${gate} in`, gate });
    say(outputs, { kind: "out", text: isOne ? "out" : `${gate} out`, gate });
  });
  return Array.from({ length: part.pins }, (_, index) => {
    const pin = index + 1;
    return roles.get(pin) ?? { pin, kind: "none" as const, text: "" };
  });
}
