import clsx from "clsx";
import { Panel } from "@/components/ui/Panel";
import { familyAt, findFamily, type Family } from "@/lib/calc/levels";
import type { Machine, NetFacts, WorstMargin } from "@/lib/calc/interconnect";
import { Basis } from "./Basis";
import { LevelLadder } from "./LevelLadder";
import { threeDigits } from "./three-digits";

const volts = (value: number) => threeDigits(value, "V");

/** The smallest margins with the pair that binds each, as sentences and drawn to scale. */
export function NetLevels({ facts: { high, low }, machine }: { facts: NetFacts; machine: Machine }) {
  if (!low && !high) return null;
  return (
    <Panel title="Levels" note={`at ${volts(machine.conditions.logicVolts)}, worst case`}>
      <div className="flex flex-col gap-4">
        {high && <Margin level="high" margin={high} machine={machine} />}
        {low && <Margin level="low" margin={low} machine={machine} />}
      </div>
      <Basis
        follows="the data sheets named in Families and JESD7-A, worst case over temperature, one supply for all cards."
        leavesOut="ringing, crosstalk and ground that differs between cards. A planning aid, never a proof of safety."
      />
    </Panel>
  );
}

type Props = { level: "high" | "low"; margin: WorstMargin; machine: Machine };

function Margin({ level, margin, machine }: Props) {
  const [driver, receiver] = [familyOf(machine, margin.driver.family), familyOf(machine, margin.receiver.family)];
  const fails = margin.volts < 0;
  return (
    <div className="grid gap-x-5 gap-y-2 sm:grid-cols-[7.5rem_minmax(0,1fr)]">
      <p>
        <span className="block text-sm text-ink-soft">Margin at {level}</span>
        <span className={clsx("mono text-lg font-semibold", fails && "text-failed")}>{volts(margin.volts)}</span>
      </p>
      <div className="min-w-0">
        <p className="max-w-prose text-[0.9375rem]">
          {driver && receiver
            ? sentence(level, margin, driver, receiver)
            : `${margin.driving} into ${margin.receiving}.`}
        </p>
        {driver && receiver && (
          <LevelLadder driver={driver} receiver={receiver} level={level} supplyVolts={machine.conditions.logicVolts} />
        )}
      </div>
    </div>
  );
}

function familyOf({ families, conditions }: Machine, name: string): Family | undefined {
  const family = findFamily(families, name);
  const moved = family && familyAt(family, conditions.logicVolts);
  return moved?.ok ? moved.value : family;
}

/** "CON-01 a10 gives 3.84 V at worst; TIM-01 a10 wants 3.15 V." */
function sentence(level: Props["level"], margin: WorstMargin, driver: Family, receiver: Family): string {
  const from = `${margin.driver.place} (${driver.name})`;
  const to = `${margin.receiver.place} (${receiver.name})`;
  return level === "high"
    ? `${from} gives ${volts(driver.vohMin)} at worst; ${to} wants ${volts(receiver.vihMin)}.`
    : `${from} leaves ${volts(driver.volMax)} at worst; ${to} takes up to ${volts(receiver.vilMax)} as low.`;
}
