"use client";

import { useFormContext, useWatch } from "react-hook-form";
import { Checkbox } from "@/components/ui/Checkbox";
import { FormQuantityField, FormSelect } from "@/components/ui/form/bound-fields";
import type { DelayView } from "@/lib/delay-path/load-delay-paths";
import type { DelayFields } from "./DelayEditor";

const CONDITIONS = [
  { at: "typicalAt", name: "Typical figures hold at" },
  { at: "limitsAt", name: "Lowest and highest hold at" },
  { at: "board", name: "This board has" },
] as const;

/** Two things that a path may be asked besides: figures at this board's supply and load, and the highest clock. */
export function DelayConditions({ view }: { view: DelayView }) {
  const { setValue, getValues } = useFormContext<DelayFields>();
  const [derating, clock] = useWatch<DelayFields, ["path.derating", "path.clock"]>({
    name: ["path.derating", "path.clock"],
  });
  const family = getValues("path.steps")[0]?.family || "HC";
  return (
    <div className="flex flex-col gap-3">
      <Checkbox
        label="Turn the figures to this board’s supply and load"
        description="By rule of thumb, for CMOS the more the lower the supply and the larger the load."
        value={derating !== null}
        onChange={(isOn) =>
          setValue("path.derating", isOn ? defaultConditions(family, view.logicVolts) : null, { shouldDirty: true })
        }
      />
      {derating !== null && (
        <div className="grid gap-4 pl-[1.875rem] sm:grid-cols-2 lg:grid-cols-4">
          <FormSelect
            name="path.derating.family"
            label="Outputs of family"
            options={view.families.map(({ name }) => ({ id: name, label: name }))}
          />
          {CONDITIONS.map(({ at, name }) => (
            <fieldset key={at} className="min-w-0">
              <legend className="text-sm font-semibold">{name}</legend>
              <div className="mt-1.5 grid grid-cols-2 gap-2">
                <FormQuantityField
                  name={`path.derating.${at}.volts`}
                  label={`${name}: supply`}
                  isLabelHidden
                  placeholder="5 V"
                />
                <FormQuantityField
                  name={`path.derating.${at}.loadPf`}
                  label={`${name}: load`}
                  isLabelHidden
                  placeholder="50 pF"
                />
              </div>
            </fieldset>
          ))}
        </div>
      )}
      <Checkbox
        label="It lies between two registers: how fast may the clock be?"
        value={clock !== null}
        onChange={(isOn) => setValue("path.clock", isOn ? EMPTY_CLOCK : null, { shouldDirty: true })}
      />
      {clock !== null && (
        <div className="grid gap-4 pl-[1.875rem] sm:grid-cols-3 lg:grid-cols-5">
          <FormQuantityField
            name="path.clock.clockToOutputMaxS"
            label="Clock to output"
            placeholder="30 ns"
            description="highest"
          />
          <FormQuantityField name="path.clock.setupS" label="Set-up" placeholder="15 ns" />
          <FormQuantityField name="path.clock.skewS" label="Skew" placeholder="2 ns" />
          <FormQuantityField name="path.clock.holdS" label="Hold" placeholder="0 ns" description="may stay empty" />
          <FormQuantityField
            name="path.clock.clockToOutputMinS"
            label="Clock to output"
            placeholder="5 ns"
            description="lowest, for the hold"
          />
        </div>
      )}
    </div>
  );
}

const EMPTY_CLOCK = { clockToOutputMaxS: "", setupS: "", skewS: "0 ns", holdS: "", clockToOutputMinS: "" };

const defaultConditions = (family: string, volts: number) => ({
  family,
  typicalAt: { volts: "5 V", loadPf: "15 pF" },
  limitsAt: { volts: "4.5 V", loadPf: "50 pF" },
  board: { volts: `${volts} V`, loadPf: "50 pF" },
});
