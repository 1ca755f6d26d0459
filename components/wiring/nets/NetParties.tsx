import { Panel } from "@/components/ui/Panel";
import { counted } from "@/components/workshop/counted";
import type { NetFacts, NetParty } from "@/lib/calc/interconnect";

/** Who drives the net and who listens, each where it stands. */
export function NetParties({ facts: { drivers, loads, pullUps } }: { facts: NetFacts }) {
  if (drivers.length + loads.length === 0) return null;
  const inputs = loads.reduce((total, load) => total + load.loads, 0);
  return (
    <div className="grid items-start gap-4 md:grid-cols-2">
      <Panel title={drivers.length === 1 ? "Driver" : "Drivers"} note={drivers.length > 1 ? drivers.length : undefined}>
        <List
          parties={drivers}
          empty={pullUps.length > 0 ? "Only a resistor gives it a level." : "Nothing drives it."}
          word={({ role, enableGroup }) => (enableGroup === "" ? role : `${role}, group ${enableGroup}`)}
        />
      </Panel>
      <Panel title="Loads" note={inputs > 0 ? counted(inputs, "input") : undefined}>
        <List
          parties={loads}
          empty="Nothing listens to it."
          word={({ role, loads: own }) =>
            `${counted(own, "input")}${role === "bidirectional" ? ", bidirectional" : ""}`
          }
        />
      </Panel>
    </div>
  );
}

type ListProps = { parties: readonly NetParty[]; empty: string; word: (party: NetParty) => string };

function List({ parties, empty, word }: ListProps) {
  if (parties.length === 0) return <p className="text-[0.9375rem] text-ink-soft">{empty}</p>;
  return (
    <ul className="flex flex-col">
      {parties.map((party, index) => (
        <li
          key={`${party.place} ${index}`}
          className="flex items-baseline justify-between gap-3 border-b border-rule py-1.5 first:pt-0 last:border-b-0 last:pb-0"
        >
          <span className="min-w-0">
            <span className="mono text-sm font-semibold">{party.place}</span>
            <span className="block text-sm text-ink-soft">{word(party)}</span>
          </span>
          <span className="mono text-sm">{party.family || "–"}</span>
        </li>
      ))}
    </ul>
  );
}
