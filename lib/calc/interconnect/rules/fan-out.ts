import type { Draft, Rule } from "../draft";
import { driverLoadings } from "../net-currents";
import { pinsOf } from "../study-net";
import { listed, netName } from "../wording";

/**
 * An output that gives or takes more current than its levels hold for; see lib/calc/levels/loading. The driver that is
 * worst off speaks. No edits: fewer loads, a buffer or a stronger family change the boards, not only the pin map.
 */
export const fanOut: Rule = (survey) =>
  survey.signalNets.flatMap((study): Draft[] => {
    if (study.receivers.length === 0) return [];
    const loadings = driverLoadings(survey, study);
    const overloaded = study.drivers.flatMap((driver, at) => {
      const loading = loadings[at];
      if (!loading || loading.holds) return [];
      const share = Math.max(loading.high.usedA / loading.high.availableA, loading.low.usedA / loading.low.availableA);
      return [{ driver, loading, share }];
    });
    const [worst] = overloaded.sort((a, b) => b.share - a.share);
    if (!worst) return [];
    return [
      {
        rule: "fan-out",
        weight: "must",
        subject: netName(study.net),
        title: (subject) => `${subject}: more loads than the output drives`,
        why: `${worst.loading.sentence} It drives from ${listed(worst.driver.pins.slice(0, 1).map(survey.place))}.`,
        mend: "Put a buffer in, share the loads among two outputs, or take a stronger family.",
        edits: [],
        pins: [...pinsOf(overloaded.map(({ driver }) => driver)), ...pinsOf(study.receivers)],
        facts: worst.loading.sentence,
        bus: worst.driver.family,
      },
    ];
  });
