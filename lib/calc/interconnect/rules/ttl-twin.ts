import { editPins } from "../edit-pins";
import type { Edit } from "../finding";
import { pairMargins, type LevelPair } from "../level-pairs";
import { distinct } from "../order";
import { pinsOf, type NetStudy } from "../study-net";
import type { Survey } from "../survey";
import { listed } from "../wording";

/** CMOS families and what is pin for pin the same with thresholds made for TTL outputs. */
const TTL_TWINS: Readonly<Record<string, string>> = { HC: "HCT", AC: "ACT", AHC: "AHCT" };

/**
 * The receivers whose levels fail, as their TTL twins. Undefined unless every one of them has a twin that then fits
 * every driver of the net, so that the edits mend all of it or nothing is offered.
 */
export function ttlTwin(
  survey: Survey,
  study: NetStudy,
  failing: readonly LevelPair[],
  level: "high" | "low",
): { families: string; edits: Edit[] } | undefined {
  const fits = (twin: string) =>
    study.drivers.every(({ family, role }) => {
      const [driving, receiving] = [survey.family(family), survey.family(twin)];
      if (!driving || !receiving || (level === "high" && role === "open-drain output")) return true;
      const { highVolts, lowVolts } = pairMargins(survey, driving, receiving);
      return (level === "high" ? highVolts : lowVolts) >= 0;
    });
  const swaps = distinct(failing.map(({ receiving }) => receiving.name)).map((name) => {
    const twin = survey.family(TTL_TWINS[name] ?? "")?.name;
    return { name, twin: twin !== undefined && fits(twin) ? twin : undefined };
  });
  const edits = swaps.flatMap(({ name, twin }) => {
    if (twin === undefined) return [];
    const inputs = study.receivers.filter(({ family }) => survey.family(family)?.name === name);
    return editPins(pinsOf(inputs), { family: twin });
  });
  const twins = swaps.flatMap(({ twin }) => twin ?? []);
  return twins.length === swaps.length ? { families: listed(distinct(twins)), edits } : undefined;
}
