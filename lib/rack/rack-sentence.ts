import type { RackView } from "./rack-view";

const counted = (count: number, one: string, many: string) => `${count} ${count === 1 ? one : many}`;

/** "8 slots, 7 cards, 178 checks. 104 hold, 5 in doubt, 1 fails. 2 findings in the wiring must be mended." */
export function rackSentence(rack: RackView): string {
  const cards = rack.slots.filter((slot) => slot.unit).length;
  const machine = [
    counted(rack.slots.length, "slot", "slots"),
    counted(cards, "card", "cards"),
    counted(rack.total, "check", "checks"),
  ].join(", ");
  const wiring =
    rack.toMend === 0 ? "" : ` ${counted(rack.toMend, "finding", "findings")} in the wiring must be mended.`;
  if (rack.total === 0) return `${machine}.${wiring}`;
  const standing = [
    counted(rack.holding, "holds", "hold"),
    rack.doubtful > 0 ? `${rack.doubtful} in doubt` : "",
    rack.reopened > 0 ? `${rack.reopened} reopened` : "",
    rack.failing > 0 ? counted(rack.failing, "fails", "fail") : "",
  ].filter((part) => part !== "");
  return `${machine}. ${standing.join(", ")}.${wiring}`;
}
