import { Panel } from "@/components/ui/Panel";
import { Disclosure } from "@/components/workshop/Disclosure";
import type { ContactLoad } from "@/lib/calc/power";
import { contactGroups, shareOf, type ContactGroup } from "@/lib/power/contact-groups";
import { ContactLine } from "./ContactLine";
import { amps, quantity } from "./figures";

type Props = { loads: readonly ContactLoad[]; ambientC: number };

/** Below this share of what a contact bears nobody needs to look. */
const WORTH_A_LOOK = 0.3;
const ALWAYS_SHOWN = 4;

/** Current in each power contact against what one bears where it is warm; the most loaded first. */
export function ContactsPanel({ loads, ambientC }: Props) {
  const groups = contactGroups(loads);
  const shown = groups.filter((group, index) => index < ALWAYS_SHOWN || shareOf(group) >= WORTH_A_LOOK);
  const rest = groups.slice(shown.length);
  const rated = loads[0]?.ratedA;
  return (
    <Panel
      title="Through the contacts"
      {...(rated === undefined ? {} : { note: `one bears ${amps(rated)} at ${quantity(ambientC, "°C")}` })}
      padding="none"
    >
      {groups.length === 0 && (
        <p className="px-4 pb-4 text-[0.9375rem] text-ink-soft sm:px-5">
          Nothing to say yet: it takes boards whose draw is known, with power and ground on their pin maps, in slots.
        </p>
      )}
      <Lines groups={shown} />
      {rest.length > 0 && (
        <div className="border-t border-rule print:hidden">
          <div className="px-4 sm:px-5">
            <Disclosure summary={`The other ${rest.length} stay below ${quantity(topShare(rest), "%")} of it`}>
              <div className="-mx-4 sm:-mx-5">
                <Lines groups={rest} />
              </div>
            </Disclosure>
          </div>
        </div>
      )}
    </Panel>
  );
}

function Lines({ groups }: { groups: readonly ContactGroup[] }) {
  return (
    <ul>
      {groups.map((group) => (
        <ContactLine key={`${group.labels[0]} ${group.rail}`} group={group} />
      ))}
    </ul>
  );
}

const topShare = (groups: readonly ContactGroup[]) => Math.ceil(Math.max(...groups.map(shareOf)) * 100 + 1e-9);
