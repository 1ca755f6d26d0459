import { logicCard } from "./logic-card";
import { mixedSignalCard } from "./mixed-signal-card";
import { passiveBackplane } from "./passive-backplane";
import type { Starter } from "./starter";
import type { StarterId } from "./starter-ids";
import { supplyCard } from "./supply-card";

export const STARTERS: Record<StarterId, Starter> = {
  "supply-card": supplyCard,
  "logic-card": logicCard,
  "passive-backplane": passiveBackplane,
  "mixed-signal-card": mixedSignalCard,
};
