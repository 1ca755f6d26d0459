import { computed, type Computed } from "../computed";
import { CONTACT_OHM, contactCurrentA, judgeContacts } from "../contact";
import { shortQuantity } from "../units";
import { type ContactLoad, type MachinePowerInput, type PoweredPlacement } from "./machine-budget";

/**
 * Worst current of each placement over its contacts of each rail and of ground, against the derated rating of a two-part
 * connector (lib/calc/contact). The placement that feeds a rail carries what all others take from it.
 * Ground carries what positive rails bring or what negative rails take, whichever is more, since they relieve each other.
 * Leaves out rails without current, and placements whose pin map is not known.
 */
export function contactLoads({ rails, placements, ambientC }: MachinePowerInput): Computed<ContactLoad[]> {
  const rated = contactCurrentA(ambientC);
  if (!rated.ok) return rated;
  const loads: ContactLoad[] = [];
  for (const placement of placements) {
    const { contacts } = placement;
    if (!contacts) continue;
    const flows = rails.map((rail) => {
      const own = worstOf(placement, rail.name);
      const others = placements.filter((one) => one !== placement);
      const fed = rail.sourcePlacement === placement.id;
      const amps = fed ? others.reduce((sum, other) => sum + worstOf(other, rail.name), 0) : own;
      return { rail: rail.name, amps, intoGround: rail.volts > 0 === !fed };
    });
    const ground = [true, false].map((into) =>
      flows.reduce((sum, flow) => sum + (flow.intoGround === into ? flow.amps : 0), 0),
    );
    const wanted = [
      ...flows.map(({ rail, amps }) => ({
        rail,
        amps,
        count: contacts.rails.filter((one) => one.rail === rail).reduce((sum, one) => sum + one.count, 0),
      })),
      { rail: "ground", amps: Math.max(...ground), count: contacts.ground },
    ].filter(({ amps }) => amps > 0);
    for (const { rail, amps, count } of wanted) {
      const load = contactLoad(placement, rail, amps, count, rated.value, ambientC);
      if (!load.ok) return load;
      loads.push(load.value);
    }
  }
  return computed(loads);
}

const worstOf = ({ draws }: PoweredPlacement, rail: string): number =>
  draws.reduce((sum, draw) => sum + (draw.rail === rail ? draw.worstA : 0), 0);

function contactLoad(
  { id, label }: PoweredPlacement,
  rail: string,
  worstA: number,
  contacts: number,
  ratedA: number,
  ambientC: number,
): Computed<ContactLoad> {
  const load = { placement: id, label, rail, contacts, worstA, ratedA };
  if (contacts === 0) {
    const sentence = `${label} takes ${shortQuantity(worstA, "A")} over ${rail}, and no contact carries it.`;
    return computed({ ...load, perContactA: null, verdict: "no contact", sentence });
  }
  const judged = judgeContacts({ currentA: worstA, contacts, contactOhm: CONTACT_OHM }, ambientC);
  if (!judged.ok) return judged;
  const { perContactA, holds, sentence } = judged.value;
  const verdict = holds ? "fits" : "too much";
  return computed({ ...load, perContactA, verdict, sentence: `${label}, ${rail}: ${sentence}` });
}
