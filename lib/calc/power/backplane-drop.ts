import { computed, fault, needsNotNegative, type Computed, type Fault } from "../computed";
import { conductorOhm } from "../conductor";
import { CONTACT_OHM, loopDropVolts } from "../contact";
import { shortQuantity } from "../units";
import { type BackplaneRail, type MachinePowerInput, type PoweredPlacement, type SlotDrop } from "./machine-budget";

/**
 * A rail of the backplane from its copper: one conductor from slot to slot, the ground like the rail where nothing else is
 * given. At the temperature of the air; the copper is warmer when it carries much.
 */
export function backplaneRail(
  rail: string,
  sourceSlot: number,
  copper: { segmentMm: number; widthMm: number; copperUm: number; groundWidthMm?: number | undefined },
  celsius: number,
): Computed<BackplaneRail> {
  const { segmentMm, widthMm, copperUm, groundWidthMm = widthMm } = copper;
  const supply = conductorOhm({ lengthMm: segmentMm, widthMm, copperUm, celsius });
  if (!supply.ok) return supply;
  const ground = conductorOhm({ lengthMm: segmentMm, widthMm: groundWidthMm, copperUm, celsius });
  if (!ground.ok) return ground;
  return computed({
    rail,
    sourceSlot,
    supplyOhm: supply.value,
    groundOhm: ground.value,
    contactOhm: CONTACT_OHM,
  });
}

type Card = { placement: PoweredPlacement; slot: number; amps: number };

/**
 * Drop from the source to each card, worst currents, V: every piece of copper between two cards carries what all cards
 * beyond it take; to it comes the drop over the card's own contacts, there and back (where the pin map is known).
 * A card is "too low" where less than the nominal voltage minus the tolerance is left.
 * Leaves out: the current of other rails in the same ground, contacts of the source, sense lines.
 */
export function backplaneDrop(input: MachinePowerInput, line: BackplaneRail): Computed<SlotDrop[]> {
  const rail = input.rails.find((one) => one.name === line.rail);
  if (!rail) return fault("backplane", `There is no rail ${line.rail} in this machine.`);
  const bad = badLine(line);
  if (bad) return bad;
  const cards = input.placements.flatMap((placement): Card[] => {
    const amps = placement.draws.reduce((sum, draw) => sum + (draw.rail === rail.name ? draw.worstA : 0), 0);
    return placement.slot === null || amps === 0 ? [] : [{ placement, slot: placement.slot, amps }];
  });
  const drops: SlotDrop[] = [];
  for (const { placement, slot, amps } of [...cards].sort((a, b) => a.slot - b.slot)) {
    const contact = contactVolts(placement, rail.name, amps, line.contactOhm);
    if (!contact.ok) return contact;
    const dropV = copperVolts(line, cards, slot) + contact.value;
    const left = Math.abs(rail.volts) - dropV;
    const least = Math.abs(rail.volts) * (1 - rail.tolerancePercent / 100);
    const fits = Number(left.toPrecision(12)) >= Number(least.toPrecision(12));
    const told = `${placement.label} gets ${shortQuantity(left, "V")} of ${rail.name}, ${shortQuantity(dropV, "V")} lost on the way`;
    drops.push({
      rail: rail.name,
      slot,
      placement: placement.id,
      label: placement.label,
      dropV,
      volts: Math.sign(rail.volts) * left,
      verdict: fits ? "fits" : "too low",
      sentence: fits ? `${told}.` : `${told}: ${shortQuantity(least, "V")} is the least.`,
    });
  }
  return computed(drops);
}

/**
 * Σ over the cards on the same side of the source of current × the copper that card and slot have in common, which is the
 * same sum as over the pieces of copper with all that flows beyond them.
 */
function copperVolts(
  { supplyOhm, groundOhm, sourceSlot }: BackplaneRail,
  cards: readonly Card[],
  slot: number,
): number {
  const side = Math.sign(slot - sourceSlot);
  const segmentAmps = cards
    .filter((card) => Math.sign(card.slot - sourceSlot) === side)
    .reduce(
      (sum, card) => sum + card.amps * Math.min(Math.abs(card.slot - sourceSlot), Math.abs(slot - sourceSlot)),
      0,
    );
  return segmentAmps * (supplyOhm + groundOhm);
}

function contactVolts(placement: PoweredPlacement, rail: string, amps: number, contactOhm: number): Computed<number> {
  const contacts = placement.contacts;
  const supply = contacts?.rails.filter((one) => one.rail === rail).reduce((sum, one) => sum + one.count, 0) ?? 0;
  if (!contacts || supply === 0 || contacts.ground === 0 || contactOhm === 0) return computed(0);
  return loopDropVolts(amps, { contacts: supply, contactOhm }, { contacts: contacts.ground, contactOhm });
}

const badLine = ({ rail, supplyOhm, groundOhm, contactOhm, sourceSlot }: BackplaneRail): Fault | undefined =>
  needsNotNegative("backplane", `resistance of ${rail} between slots`, supplyOhm) ??
  needsNotNegative("backplane", `resistance of ground beside ${rail}`, groundOhm) ??
  needsNotNegative("backplane", "resistance of a contact", contactOhm) ??
  (Number.isInteger(sourceSlot)
    ? undefined
    : fault("backplane", `The slot that feeds ${rail} must be a whole number.`));
