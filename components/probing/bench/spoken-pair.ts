import type { RoundPoint, RoundProbe } from "@/lib/probing/round-view";

/** "U 12 pin 3 and J 1 pin a 4, should beep": hyphens would be swallowed, letters and figures run together. */
export function spokenPair(probe: RoundProbe, a: RoundPoint, b: RoundPoint): string {
  const expected = probe.expect === "joined" ? "should beep" : "should stay silent";
  return `${spokenPoint(a.name)}, and ${spokenPoint(b.name)}. ${expected}`;
}

const spokenPoint = (name: string): string =>
  name
    .replace(/^([^-]+)-(.+)$/, "$1 pin $2")
    .replace(/([a-z])(\d)/gi, "$1 $2")
    .replace(/\s+/g, " ");
