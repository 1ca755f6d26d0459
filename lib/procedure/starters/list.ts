import { logicCard } from "./logic-card";
import { mixedSignalCard } from "./mixed-signal-card";
import { passiveBackplane } from "./passive-backplane";
import type { Starter } from "./starter";
import { supplyCard } from "./supply-card";

export const STARTER_IDS = ["supply-card", "logic-card", "passive-backplane", "mixed-signal-card"] as const;
export type StarterId = (typeof STARTER_IDS)[number];

export const STARTERS: Record<StarterId, Starter> = {
  "supply-card": supplyCard,
  "logic-card": logicCard,
  "passive-backplane": passiveBackplane,
  "mixed-signal-card": mixedSignalCard,
};
