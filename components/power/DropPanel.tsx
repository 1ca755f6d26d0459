import { Panel } from "@/components/ui/Panel";
import type { SlotDrop } from "@/lib/calc/power";
import type { PowerView, RailView } from "@/lib/power/power-view";
import { DropDrawing } from "./DropDrawing";
import { VerdictWord } from "./VerdictWord";

type Props = Pick<PowerView, "copper" | "slots"> & { rails: readonly RailView[]; drops: readonly SlotDrop[] };

/** What is left of each rail at each slot. */
export function DropPanel({ rails, drops, copper, slots }: Props) {
  const shown = rails.filter(({ name, sourceSlot }) => sourceSlot !== null && drops.some(({ rail }) => rail === name));
  return (
    <Panel title="Along the backplane" note="at worst, there and back, contacts included">
      {shown.length === 0 ? (
        <p className="text-[0.9375rem] text-ink-soft">
          Give a rail the sizes of its copper (Supply, More, Change the rail); then what is lost on the way to each slot
          is drawn here.
        </p>
      ) : (
        <div className="flex flex-col gap-6">
          {shown.map((rail) => {
            const own = drops.filter((drop) => drop.rail === rail.name);
            const low = own.filter(({ verdict }) => verdict === "too low");
            const worst = own.reduce((most, drop) => (drop.dropV > most.dropV ? drop : most));
            return (
              <figure key={rail.name} className="min-w-0">
                <figcaption className="mb-2 flex flex-wrap items-baseline gap-x-3">
                  <span className="mono font-semibold">{rail.name}</span>
                  <span className="text-sm">{(low[0] ?? worst).sentence}</span>
                  <span className="text-sm">
                    <VerdictWord standing={low.length > 0 ? "bad" : "good"}>
                      {low.length > 0 ? "too low" : "fits"}
                    </VerdictWord>
                  </span>
                </figcaption>
                <DropDrawing rail={rail} drops={own} slots={slots} />
                <CopperLine load={copper[rail.name]} />
              </figure>
            );
          })}
        </div>
      )}
    </Panel>
  );
}

function CopperLine({ load }: { load: PowerView["copper"][string] | undefined }) {
  if (!load) return null;
  return (
    <p className="mt-2 flex flex-wrap items-baseline gap-x-3 text-sm">
      <span className={load.fits ? "text-ink-soft" : ""}>{load.sentence}</span>
      <VerdictWord standing={load.fits ? "good" : "bad"}>{load.fits ? "bears it" : "too thin"}</VerdictWord>
    </p>
  );
}
