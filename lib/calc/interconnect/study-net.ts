import type { PinRole } from "./machine";
import type { Net, NetPin } from "./net";

/** A board's own copper with the role it plays on the net; several pins of one signal are one driver or receiver. */
export type Party = {
  placement: string;
  signal: string;
  role: PinRole;
  family: string;
  enableGroup: string;
  /** Inputs that hang on it. */
  loads: number;
  pins: NetPin[];
};

/** What the rules want to know of a net, worked out once. */
export type NetStudy = {
  net: Net;
  drivers: Party[];
  receivers: Party[];
  pullUps: NetPin[];
  power: NetPin[];
  ground: NetPin[];
  /** Placements of cards that do more than pass the net on. */
  active: Set<string>;
  /** Whether a driver may stand behind a connector that meets nothing known, or behind a passive pin. */
  mayBeDrivenFromOutside: boolean;
  mayBeHeardOutside: boolean;
};

export const DRIVES: ReadonlySet<PinRole> = new Set<PinRole>([
  "push-pull output",
  "three-state output",
  "open-drain output",
  "bidirectional",
]);
const LISTENS: ReadonlySet<PinRole> = new Set<PinRole>(["input", "bidirectional"]);

export function studyNet(net: Net): NetStudy {
  const drivers = new Map<string, Party>();
  const receivers = new Map<string, Party>();
  const passive: NetPin[] = [];
  const study: NetStudy = {
    net,
    drivers: [],
    receivers: [],
    pullUps: [],
    power: [],
    ground: [],
    active: new Set(),
    mayBeDrivenFromOutside: false,
    mayBeHeardOutside: false,
  };
  for (const pin of net.pins) {
    const { role } = pin;
    if (pin.pullUpOhm !== null) study.pullUps.push(pin);
    if (role === "power") study.power.push(pin);
    if (role === "ground") study.ground.push(pin);
    if (DRIVES.has(role)) join(drivers, pin);
    if (LISTENS.has(role) || (DRIVES.has(role) && pin.loads > 0)) join(receivers, pin);
    if (DRIVES.has(role) || LISTENS.has(role)) study.active.add(pin.placement);
    if (pin.kind === "card" && role === "passive") passive.push(pin);
    if (pin.kind === "card" && !pin.isMated && role !== "no connection") {
      if (LISTENS.has(role)) study.mayBeDrivenFromOutside = true;
      if (DRIVES.has(role)) study.mayBeHeardOutside = true;
    }
  }
  if (passive.length > 0 && passive.some((pin) => leadsElsewhere(pin, net.pins))) {
    study.mayBeDrivenFromOutside = true;
    study.mayBeHeardOutside = true;
  }
  study.drivers = [...drivers.values()];
  study.receivers = [...receivers.values()].map((party) =>
    LISTENS.has(party.role) ? { ...party, loads: Math.max(1, party.loads) } : party,
  );
  return study;
}

/**
 * A passive pin leads on to the board's other connector, whose net is known when it meets one; else to a switch, a lamp
 * or a plug, of which nothing is known.
 */
const leadsElsewhere = (pin: NetPin, pins: readonly NetPin[]): boolean =>
  !pin.isMated || !pins.some((other) => other.placement === pin.placement && other.connectorId !== pin.connectorId);

function join(parties: Map<string, Party>, pin: NetPin): void {
  const { placement, signal, role, family, enableGroup, loads } = pin;
  // A pin without a signal is copper of its own.
  const copper = signal === "" ? `${pin.connectorId} ${pin.pin}` : signal;
  const key = [placement, copper, role, family, enableGroup].join("\u0000");
  const same = parties.get(key);
  if (same) {
    same.pins.push(pin);
    same.loads += loads;
  } else {
    parties.set(key, { placement, signal, role, family, enableGroup, loads, pins: [pin] });
  }
}

/** Names the copper of a party: its board and signal; a pin without a signal is copper of its own. */
export const copperOf = ({ placement, signal, pins }: Party): string =>
  signal === ""
    ? `${placement}\u0000\u0000${pins[0]?.connectorId ?? ""}\u0000${pins[0]?.pin ?? ""}`
    : `${placement}\u0000${signal}`;

/** Whether both are the same copper of the same board: a bidirectional pin and its own input. */
export const isSameCopper = (one: Party, other: Party): boolean =>
  one.placement === other.placement && one.signal === other.signal && copperOf(one) === copperOf(other);

export const pinsOf = (parties: readonly Party[]): NetPin[] => parties.flatMap(({ pins }) => pins);
