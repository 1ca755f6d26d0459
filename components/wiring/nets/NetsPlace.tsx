"use client";

import clsx from "clsx";
import { parseAsString, parseAsStringLiteral, useQueryStates } from "nuqs";
import { useMemo } from "react";
import { Page } from "@/components/shell/Page";
import { ButtonLink } from "@/components/ui/ButtonLink";
import { EmptyState } from "@/components/ui/EmptyState";
import { netFactsOf, SIGNAL_CLASSES } from "@/lib/calc/interconnect";
import type { NetsView } from "@/lib/net/load-nets";
import type { SaveSignal } from "../signals/signal-acts";
import { filterNets, netLines, netNamed, netsSentence, PROBLEMS } from "./net-lines";
import { NetFilters } from "./NetFilters";
import { NetList } from "./NetList";
import { NetPanel } from "./NetPanel";

type Props = NetsView & { project: string; canEdit: boolean; save: SaveSignal };

/** Every net of the assembled machine, and one of them with all that is known and reckoned of it. */
export function NetsPlace({ machine, findings, signals, project, canEdit, save }: Props) {
  const [query, setQuery] = useQueryStates({
    net: parseAsString,
    search: parseAsString.withDefault(""),
    class: parseAsStringLiteral(SIGNAL_CLASSES),
    problem: parseAsStringLiteral(PROBLEMS).withDefault("any"),
  });
  const lines = useMemo(() => netLines(machine, findings), [machine, findings]);
  const factsOf = useMemo(() => netFactsOf(machine), [machine]);
  const shown = filterNets(lines, query);
  const chosen = query.net === null ? undefined : netNamed(lines, query.net);
  const choose = (net: string | null) => void setQuery({ net }, { history: "push" });
  if (lines.length === 0) {
    return (
      <Page title="Nets" lede="Nothing is wired yet.">
        <EmptyState
          title="No nets yet"
          action={
            <ButtonLink kind="primary" href={`/projects/${project}/wiring`}>
              Go to the pins
            </ButtonLink>
          }
        >
          A net is the copper that joins pins through all boards and slots. Say what the pins of the boards carry, and
          of the slots, and the nets of the machine are listed here with their drivers, loads and margins.
        </EmptyState>
      </Page>
    );
  }
  return (
    <Page title="Nets" lede={netsSentence(lines, machine)} className={chosen ? "max-lg:[&>header]:sr-only" : ""}>
      <div
        className={clsx(
          "grid grid-cols-1 items-start gap-5",
          chosen && "lg:grid-cols-[minmax(17rem,21rem)_minmax(0,1fr)]",
        )}
      >
        <section aria-label="List of nets" className={clsx("min-w-0", chosen && "max-lg:hidden lg:sticky lg:top-4")}>
          <NetFilters
            filter={query}
            found={shown.length}
            isNarrow={chosen !== undefined}
            onChange={(change) => void setQuery(change)}
          />
          <NetList lines={shown} factsOf={factsOf} chosen={chosen} isNarrow={chosen !== undefined} onChoose={choose} />
        </section>
        {chosen && (
          <NetPanel
            key={chosen.net.id}
            line={chosen}
            facts={factsOf(chosen.net)}
            machine={machine}
            signal={signals.find(({ name }) => name === chosen.net.name)}
            project={project}
            canEdit={canEdit}
            save={save}
            onClose={() => choose(null)}
          />
        )}
      </div>
    </Page>
  );
}
