"use client";

import { useState } from "react";
import { useFormContext } from "react-hook-form";
import { Button } from "@/components/ui/Button";
import { QuantityField } from "@/components/ui/QuantityField";
import { Select } from "@/components/ui/Select";
import { rippleCarrySteps } from "@/lib/calc/delay";
import type { DelayView } from "@/lib/delay-path/load-delay-paths";
import { readCount } from "@/lib/form/whole-count";
import { Disclosure } from "@/components/workshop/Disclosure";
import type { DelayFields } from "./DelayEditor";
import { EMPTY_STEP } from "./delay-draft";

const ENDS = [
  { id: "carryOut", label: "to the carry out" },
  { id: "lastSum", label: "to the last sum" },
] as const;

/** Gates of a full adder by their part: what rippleCarrySteps counts, step by step. */
const PARTS = { xor: "86", and: "08", or: "32" } as const;

/** Fills the chain with the slowest path of an adder whose carry ripples through. */
export function RippleSteps({ view }: { view: DelayView }) {
  const { setValue } = useFormContext<DelayFields>();
  const [bits, setBits] = useState("16");
  const [family, setFamily] = useState("HC");
  const [end, setEnd] = useState<(typeof ENDS)[number]["id"]>("carryOut");
  const count = readCount(bits, { most: 1000 });

  function fill() {
    if (typeof count !== "number") return;
    const gate = (name: string) => ({ name, minS: null, typicalS: null, maxS: null });
    const steps = rippleCarrySteps(count, { xor: gate(PARTS.xor), and: gate(PARTS.and), or: gate(PARTS.or) })[end];
    setValue(
      "path.steps",
      steps.map(({ name, count: times }) => ({ ...EMPTY_STEP, part: name, family, count: String(times) })),
      { shouldDirty: true },
    );
  }

  return (
    <Disclosure summary="Fill in a carry that ripples through an adder">
      <div className="flex flex-col gap-3 rounded border border-rule px-3.5 py-3">
        <p className="text-sm text-ink-soft">
          Full adders of two XOR, two AND and one OR. An operand bit of the first stage that rises while every stage
          passes the carry on shows the slowest case.
        </p>
        <div className="flex flex-wrap items-start gap-3">
          <QuantityField
            label="Bits"
            className="w-24"
            inputMode="numeric"
            value={bits}
            onChange={setBits}
            error={typeof count === "number" ? undefined : `Bits: ${count.message}`}
          />
          <Select
            label="Family"
            className="w-36"
            value={family}
            onChange={setFamily}
            options={view.families.map(({ name }) => ({ id: name, label: name }))}
          />
          <Select
            label="From an operand bit"
            className="w-48"
            value={end}
            onChange={(id) => setEnd(ENDS.find((one) => one.id === id)?.id ?? "carryOut")}
            options={ENDS}
          />
          <Button className="mt-[1.65rem]" isDisabled={typeof count !== "number"} onPress={fill}>
            Put these steps in
          </Button>
        </div>
      </div>
    </Disclosure>
  );
}
