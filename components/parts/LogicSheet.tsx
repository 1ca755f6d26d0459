import { Badge } from "@/components/ui/Badge";
import { gateFunctionName, partLabel, type LogicPart } from "@/lib/calc/logic-parts";
import { FamilyTable } from "./FamilyTable";
import { PinoutDrawing } from "./PinoutDrawing";

/** All that is known of one logic part, with where it comes from. */
export function LogicSheet({ part, isOwn }: { part: LogicPart; isOwn: boolean }) {
  const label = partLabel(part, "…");
  const rests = part.pinout?.flatMap(({ restHigh }) => restHigh) ?? [];
  return (
    <article aria-label={label} className="flex flex-col gap-4">
      <header>
        <h2 className="flex flex-wrap items-baseline gap-x-3 gap-y-1 text-xl">
          <span className="mono text-[0.85em]">{label}</span> {part.name} {isOwn && <Badge tone="copper">own</Badge>}
        </h2>
      </header>
      <div className="flex flex-wrap items-start gap-x-8 gap-y-4">
        <div className="w-64 max-w-full rounded-md border border-rule px-1 py-2">
          {part.pinout ? (
            <PinoutDrawing part={part} title={label} />
          ) : (
            <p className="px-3 py-8 text-center text-sm text-ink-soft">The pins are not written down.</p>
          )}
        </div>
        <dl className="grid min-w-56 flex-1 grid-cols-[auto_minmax(0,1fr)] gap-x-5 gap-y-1.5 text-[0.9375rem]">
          <Fact name="One gate">{gateFunctionName(part.gateFunction)}</Fact>
          <Fact name="In a package">
            {part.gatesPerPackage === 1 ? "1 gate" : `${part.gatesPerPackage} gates`}
            {part.bitsPerGate > 1 && `, ${part.bitsPerGate} bits each`}
          </Fact>
          <Fact name="Outputs">{part.output}</Fact>
          <Fact name="Pins">
            {part.pins}, supply {part.powerPins.join(" ") || "?"}, ground {part.groundPins.join(" ") || "?"}
          </Fact>
          <Fact name="Input">{part.inputPf} pF</Fact>
          {part.sharedInputs.length > 0 && (
            <Fact name="Common to all">
              pins {part.sharedInputs.join(", ")}: gates can share a package only if these may be common
            </Fact>
          )}
          {rests.length > 0 && (
            <Fact name="Rest high">pins {[...new Set(rests)].join(", ")} of a spare gate go to the rail</Fact>
          )}
        </dl>
      </div>
      <FamilyTable part={part} />
      <p className="text-sm text-ink-soft">
        <span className="font-semibold">Source:</span> {part.source}
      </p>
    </article>
  );
}

function Fact({ name, children }: { name: string; children: React.ReactNode }) {
  return (
    <>
      <dt className="text-ink-soft">{name}</dt>
      <dd>{children}</dd>
    </>
  );
}
