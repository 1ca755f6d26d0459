"use client";

import { useFormContext, useWatch } from "react-hook-form";
import { Button } from "@/components/ui/Button";
import { ComboBox } from "@/components/ui/ComboBox";
import { FormQuantityField, FormSelect, FormTextArea, FormTextField } from "@/components/ui/form/bound-fields";
import { gateFunctionName, LOGIC_PARTS, partLabel } from "@/lib/calc/logic-parts";
import type { SavePartTyped } from "@/lib/part/schema";
import { EMPTY_LOGIC, typeLogic } from "@/lib/part/type-logic";
import { FigureFields } from "./FigureFields";
import { GateFunctionField } from "./GateFunctionField";

const OUTPUTS = [
  { id: "push-pull", label: "push-pull" },
  { id: "three-state", label: "three-state" },
  { id: "open-drain", label: "open drain" },
];
const BUILT_IN = LOGIC_PARTS.map((part) => ({
  id: part.number,
  label: partLabel(part, "…"),
  description: `${part.name}, ${gateFunctionName(part.gateFunction)}`,
}));

/** The part's own logic data, as its data sheet has it; most parts have none. */
export function LogicFields() {
  const { setValue, formState } = useFormContext<SavePartTyped>();
  const logic = useWatch<SavePartTyped, "logic">({ name: "logic" });
  const { errors } = formState;
  if (logic === null) {
    return (
      <div className="rounded border border-dashed border-rule-strong px-3.5 py-3">
        <p className="text-[0.9375rem] text-ink-soft">
          Is it a logic part whose gates blocks should count? Then write down its gates, pins and figures.
        </p>
        <Button size="sm" className="mt-2" onPress={() => setValue("logic", EMPTY_LOGIC)}>
          Add logic data
        </Button>
      </div>
    );
  }
  return (
    <fieldset className="flex min-w-0 flex-col gap-4 rounded border border-rule px-3.5 pb-4 pt-2.5">
      <legend className="px-1 text-sm font-semibold">Logic data</legend>
      <ComboBox
        label="Begin with the data of"
        description="Fills in what is below; change what your data sheet says otherwise."
        options={BUILT_IN}
        value={null}
        onChange={(number) => {
          const like = LOGIC_PARTS.find((part) => part.number === number);
          if (like) setValue("logic", { ...typeLogic(like), source: "" });
        }}
      />
      <div className="grid gap-4 sm:grid-cols-3">
        <FormTextField name="logic.name" label="Name" placeholder="Quad 2-input NAND" maxLength={120} />
        <GateFunctionField />
        <FormSelect name="logic.output" label="Outputs" options={OUTPUTS} />
      </div>
      <div className="grid grid-cols-2 gap-x-4 gap-y-4 sm:grid-cols-6">
        <FormQuantityField name="logic.pins" label="Pins" inputMode="numeric" />
        <FormQuantityField name="logic.gatesPerPackage" label="Gates" inputMode="numeric" />
        <FormQuantityField name="logic.inputsPerGate" label="Inputs a gate" inputMode="numeric" />
        <FormQuantityField name="logic.outputsPerGate" label="Outputs a gate" inputMode="numeric" />
        <FormQuantityField name="logic.bitsPerGate" label="Bits a gate" inputMode="numeric" />
        <FormQuantityField name="logic.inputPf" label="Capacitance" placeholder="3.5 pF" />
      </div>
      <div className="grid gap-4 sm:grid-cols-2">
        <FormTextArea
          name="logic.gates"
          label="Pins of the gates"
          rows={5}
          description="One line a gate: inputs, then > and outputs, such as 1 2 > 3. A ^ behind an input that rests high when the gate is spare: 1^ 2 > 5. May stay empty."
        />
        <div className="grid grid-cols-2 content-start gap-4">
          <FormTextField name="logic.powerPins" label="Supply pins" mono placeholder="14" />
          <FormTextField name="logic.groundPins" label="Ground pins" mono placeholder="7" />
          <FormTextField name="logic.sharedInputs" label="Inputs of all gates" mono />
          <FormTextField name="logic.sharedOutputs" label="Outputs of all" mono />
          <FormTextField name="logic.unconnectedPins" label="Carry nothing" mono />
        </div>
      </div>
      <FigureFields />
      <FormTextField
        name="logic.source"
        label="Source"
        maxLength={300}
        placeholder="Maker’s data sheet, revision and date"
        isRequired
      />
      {errors.logic?.message && <p className="text-sm font-medium text-failed">{errors.logic.message}</p>}
      <Button size="sm" kind="quiet" className="self-start" onPress={() => setValue("logic", null)}>
        Take the logic data out
      </Button>
    </fieldset>
  );
}
