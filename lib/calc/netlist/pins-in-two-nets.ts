import type { Net } from "./netlist";
import { pinKey, pinName } from "./pin-name";

/** Every pin that a second net claims, with the line that claims it. */
export function pinsInTwoNets(nets: readonly Net[]): { pin: string; line: number; net: string; before: string }[] {
  const netOf = new Map<string, string>();
  const twice: { pin: string; line: number; net: string; before: string }[] = [];
  for (const { name, points } of nets) {
    for (const point of points) {
      if (point.part === "" || point.pin === "") continue;
      const pin = pinKey(point);
      const before = netOf.get(pin);
      if (before === undefined) netOf.set(pin, name);
      else if (before !== name) twice.push({ pin: pinName(point), line: point.line, net: name, before });
    }
  }
  return twice;
}
