import { pinNamed, pinsApartMm } from "../../connector";
import { byName, distinct } from "../order";
import type { NetStudy, Party } from "../study-net";
import type { Survey } from "../survey";
import { netName } from "../wording";

export type GroupChoice = { group: string; from: "the net" | "neighbours" | "nowhere" };

/**
 * The enable group that the drivers of a net would best be in: the one that most of them have, else that of the nearest
 * three-state pin on the same connector, else a new one named after the net.
 */
export function chooseGroup(survey: Survey, { net, drivers }: NetStudy): GroupChoice {
  const own = commonest(drivers);
  if (own !== undefined) return { group: own, from: "the net" };
  const near = distinct(drivers.flatMap((party) => nearestGroup(survey, party)))[0];
  if (near !== undefined) return { group: near, from: "neighbours" };
  return { group: `${netName(net)}_SEL`, from: "nowhere" };
}

function commonest(drivers: readonly Party[]): string | undefined {
  const counts = new Map<string, number>();
  for (const { enableGroup } of drivers) {
    if (enableGroup !== "") counts.set(enableGroup, (counts.get(enableGroup) ?? 0) + 1);
  }
  return [...counts].sort(([a, many], [b, others]) => others - many || byName(a, b))[0]?.[0];
}

function nearestGroup({ index }: Survey, { pins }: Party): string[] {
  const [pin] = pins;
  const connector = pin && index.byCode.get(pin.board)?.byConnector.get(pin.connectorId);
  const here = connector && pinNamed(connector.face, pin.pin);
  if (!connector || !here) return [];
  const apart = (name: string) => {
    const there = pinNamed(connector.face, name);
    return there ? pinsApartMm(connector.face, here, there) : Infinity;
  };
  const [nearest] = connector.pins
    .filter(({ design }) => design.role === "three-state output" && design.enableGroup.trim() !== "")
    .map((other) => ({ group: other.design.enableGroup.trim(), mm: apart(other.name) }))
    .sort((a, b) => (a.mm === b.mm ? byName(a.group, b.group) : a.mm - b.mm));
  return nearest && Number.isFinite(nearest.mm) ? [nearest.group] : [];
}

/** "in the group SUM_SEL like their neighbours": how a mend names the group. */
export function groupWords({ group, from }: GroupChoice): string {
  if (from === "neighbours") return `in the group ${group} like their neighbours`;
  return from === "the net"
    ? `in the group ${group}`
    : `in one group, say ${group}, of which a decoder turns on one at a time`;
}
