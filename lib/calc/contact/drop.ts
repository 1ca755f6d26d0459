import { computed, needsCount, needsNotNegative, needsPositive, fault, type Computed, type Fault } from "../computed";
import { formatQuantity } from "../units";
import { celsius, contactCurrentA } from "./derating";

/** Of one new contact at 100 mA, Ω; 40 mΩ after 400 matings. Read in two makers' sheets of DIN 41612 connectors. */
export const CONTACT_OHM = 0.02;

/** Contacts side by side that carry one current. */
export type ContactRow = { currentA: number; contacts: number; contactOhm: number };

export type ContactDrop = { perContactA: number; dropVolts: number; perContactW: number };

/**
 * Drop over contacts in parallel: I/n in each, I/n · R, (I/n)² · R, taken to share alike.
 * Leaves out: that they do not share alike (the contact nearest to the load takes most), ageing, the crimp or solder.
 */
export function contactDrop(row: ContactRow): Computed<ContactDrop> {
  const bad = badRow(row);
  if (bad) return bad;
  const perContactA = row.currentA / row.contacts;
  return computed({
    perContactA,
    dropVolts: perContactA * row.contactOhm,
    perContactW: perContactA ** 2 * row.contactOhm,
  });
}

/** There and back: the drop over the supply contacts and that over the ground contacts, V. */
export function loopDropVolts(currentA: number, supply: Path, ground: Path): Computed<number> {
  const there = contactDrop({ currentA, ...supply });
  if (!there.ok) return there;
  const back = contactDrop({ currentA, ...ground });
  return back.ok ? computed(there.value.dropVolts + back.value.dropVolts) : back;
}

type Path = Omit<ContactRow, "currentA">;

export type ContactJudgement = ContactDrop & {
  /** What one contact bears at the ambient temperature, A. */
  limitA: number;
  /** perContactA / limitA. */
  share: number;
  holds: boolean;
  /** Contacts that would do. */
  contactsNeeded: number;
  sentence: string;
};

/** The current per contact against the derated one of the two-part connector. Source: see contactCurrentA. */
export function judgeContacts(row: ContactRow, ambientC: number): Computed<ContactJudgement> {
  const drop = contactDrop(row);
  if (!drop.ok) return drop;
  const limit = contactCurrentA(ambientC);
  if (!limit.ok) return limit;
  const { perContactA } = drop.value;
  const contactsNeeded = Math.ceil(Number((row.currentA / limit.value).toPrecision(12)));
  const holds = row.contacts >= contactsNeeded;
  const told = `${amps(perContactA)} a contact; one bears ${amps(limit.value)} at ${celsius(ambientC)}`;
  const sentence = holds ? `${told}.` : `${told}: ${contactsNeeded} contacts would do.`;
  return computed({
    ...drop.value,
    limitA: limit.value,
    share: perContactA / limit.value,
    holds,
    contactsNeeded,
    sentence,
  });
}

const amps = (value: number) => formatQuantity({ value, unit: "A" }, { significant: 3 });

function badRow({ currentA, contacts, contactOhm }: ContactRow): Fault | undefined {
  return (
    needsNotNegative("currentA", "current", currentA) ??
    needsCount("contacts", "number of contacts", contacts) ??
    (contacts === 0 ? fault("contacts", "There is no contact to carry the current.") : undefined) ??
    needsPositive("contactOhm", "resistance of a contact", contactOhm)
  );
}
