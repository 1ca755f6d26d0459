import type { Rule } from "./draft";
import { clockNeighbours } from "./rules/clock-neighbours";
import { cannotMate, claimedTwice, looseEnds, pinsTwice, unknownPins } from "./rules/connectors";
import { contactCurrent, railMissing } from "./rules/contact-current";
import { enableGroups, mixedOutputs, twoPushPull } from "./rules/contention";
import { fanOut } from "./rules/fan-out";
import { unknownFamilies } from "./rules/families";
import { farGround } from "./rules/far-ground";
import { groundMissing } from "./rules/ground-missing";
import { levelsDoNotFit } from "./rules/levels";
import { caseOnly, namedDifferently } from "./rules/naming";
import { powerOnSignal } from "./rules/power-on-signal";
import { noPullUp, pullUpOutside, severalPullUps } from "./rules/pull-ups";
import { railRole, railsJoined, unknownRail } from "./rules/rails";
import { noDriver, oneSlotOnly } from "./rules/reach";
import { openInputs, spareGates } from "./rules/unused-inputs";

/** Every rule of the check; connectors that are listed mirrored are looked at before, see check.ts. */
export const RULES: readonly Rule[] = [
  twoPushPull,
  mixedOutputs,
  enableGroups,
  noDriver,
  oneSlotOnly,
  powerOnSignal,
  railsJoined,
  railRole,
  unknownRail,
  railMissing,
  groundMissing,
  contactCurrent,
  noPullUp,
  severalPullUps,
  pullUpOutside,
  levelsDoNotFit,
  fanOut,
  unknownFamilies,
  namedDifferently,
  caseOnly,
  farGround,
  clockNeighbours,
  openInputs,
  spareGates,
  cannotMate,
  claimedTwice,
  unknownPins,
  pinsTwice,
  looseEnds,
];
