import { roundedVolts } from "./exact";
import type { Family } from "./family";
import { input, output, volts } from "./wording";

/** Above its supply an input without tolerance clamps; absolute maxima are VCC + 0.5 V, from memory. */
const CLAMP_VOLTS = 0.5;

export type InputStress = { over: boolean; reachesVolts: number; bearsVolts: number; sentence: string };

/**
 * Whether a driver's high level is more than the receiver's input bears, both at the supply that their figures are for
 * (see familyAt). The driver is taken to reach its supply; a bipolar one stays about a volt below, which is left unused.
 * Leaves out: a receiver without supply (then any level above 0.5 V flows into it), and ringing above the supply.
 */
export function inputStress(driver: Family, receiver: Family): InputStress {
  const reachesVolts = driver.volts;
  const bearsVolts = receiver.inputMaxVolts ?? roundedVolts(receiver.volts + CLAMP_VOLTS);
  const over = reachesVolts > bearsVolts;
  const reach = `${output(driver)} can reach ${volts(reachesVolts)}`;
  const bears = `the ${input(receiver)} at ${volts(receiver.volts)} bears ${volts(bearsVolts)}`;
  return { over, reachesVolts, bearsVolts, sentence: `${reach}; ${bears}.` };
}
