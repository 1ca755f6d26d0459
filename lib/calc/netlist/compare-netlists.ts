import type { NetlistDifference } from "./difference";
import type { Net, Netlist, NetPoint } from "./netlist";
import { pinKey, pinName } from "./pin-name";

/**
 * What changed from `before` to `after`. A net whose pins are all those of another net is that net under a new name, even where
 * two nets exchange their names. A pin that two nets claim counts for the first.
 */
export function compareNetlists(before: Netlist, after: Netlist): NetlistDifference {
  const [old, now] = [indexed(before), indexed(after)];
  const renames = findRenames(old, now);
  const targets = new Set(renames.values());
  const image = (name: string | null): string | null | undefined => {
    if (name === null) return null;
    return renames.get(name) ?? (now.nets.has(name) && !targets.has(name) ? name : undefined);
  };
  const kept = new Set([...old.nets.keys()].map(image));
  const moved: NetlistDifference["moved"] = [];
  const pinsLost: NetlistDifference["pinsLost"] = [];
  for (const [key, { pin, net }] of old.pins) {
    const there = now.pins.get(key);
    if (!there) pinsLost.push({ pin, net });
    else if (image(net) !== there.net) moved.push({ pin, from: net, to: there.net });
  }
  return {
    gained: [...now.nets.keys()].filter((name) => !kept.has(name)),
    lost: [...old.nets.keys()].filter((name) => image(name) === undefined),
    renamed: [...renames].map(([from, to]) => ({ from, to })),
    moved,
    pinsGained: [...now.pins].filter(([key]) => !old.pins.has(key)).map(([, one]) => one),
    pinsLost,
  };
}

type Indexed = {
  /** Net by name, with its pins as one word; empty for a net without named pins. */
  nets: Map<string, string>;
  pins: Map<string, { pin: string; net: string | null }>;
};

function indexed({ nets, unconnected }: Netlist): Indexed {
  const pins: Indexed["pins"] = new Map();
  const take = (net: string | null, points: readonly NetPoint[]) => {
    for (const point of points) {
      if (point.part !== "" && !pins.has(pinKey(point))) pins.set(pinKey(point), { pin: pinName(point), net });
    }
  };
  for (const { name, points } of nets) take(name, points);
  take(null, unconnected);
  return { nets: new Map(nets.map((net) => [net.name, pinsAsWord(net)])), pins };
}

const pinsAsWord = ({ points }: Net): string =>
  [...new Set(points.filter(({ part }) => part !== "").map(pinKey))].sort().join("\t");

/** From the old name to the new one. */
function findRenames(old: Indexed, now: Indexed): Map<string, string> {
  const free = new Map<string, string>();
  for (const [name, word] of now.nets) if (word !== "" && old.nets.get(name) !== word) free.set(word, name);
  const renames = new Map<string, string>();
  for (const [name, word] of old.nets) {
    const to = now.nets.get(name) === word ? undefined : free.get(word);
    if (to === undefined) continue;
    renames.set(name, to);
    free.delete(word);
  }
  return renames;
}
