import { signalKey } from "../signal-names";

/** Names of supplies and grounds as people write them (common practice, no source). */
const WORDS =
  /^(?:[ADPSC]?GND[A-Z0-9]{0,3}|GND[_-].*|[AD]?V(?:CC|DD|SS|EE|BAT|PP|REF)[A-Z0-9_.]{0,6}|0V|EARTH|CHASSIS)$/;

/** "+5V" by signalKey, and what some hang behind: "+5V_A". */
const VOLTS = /^[+-]\d+(?:\.\d+)?V(?:[_-].*)?$/;

/** Whether the name alone gives a net away as a supply or a ground. */
export function isRailName(name: string): boolean {
  const key = signalKey(name.slice(name.lastIndexOf("/") + 1));
  return WORDS.test(key) || VOLTS.test(key);
}
