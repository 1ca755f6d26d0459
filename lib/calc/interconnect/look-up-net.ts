import type { Net } from "./net";

type At = { placement: string; connectorId: string; pin: string };

export const pinKey = ({ placement, connectorId, pin }: At): string => `${placement}\u0000${connectorId}\u0000${pin}`;

/** Who else is on this pin: from a pin to the net that it is part of. */
export function netsByPin(nets: readonly Net[]): (pin: At) => Net | undefined {
  const byPin = new Map(nets.flatMap((net) => net.pins.map((pin) => [pinKey(pin), net] as const)));
  return (pin) => byPin.get(pinKey(pin));
}
