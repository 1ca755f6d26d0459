"use client";

import { useWatch } from "react-hook-form";
import { FormQuantityField, FormRadioGroup, FormSelect, FormTextField } from "@/components/ui/form/bound-fields";
import type { PowerLineItem } from "@/lib/power/line-item";

type Props = { kind: PowerLineItem["kind"]; rails: readonly string[] };

/** The fields of one kind of line. */
export function LineFields({ kind, rails }: Props) {
  return (
    <>
      <div className="grid gap-4 sm:grid-cols-[minmax(0,2fr)_minmax(0,1fr)_6rem]">
        <FormTextField
          name="label"
          label={kind === "whole" ? "Where from (may be empty)" : "Name"}
          autoComplete="off"
          description={HINTS[kind]}
        />
        <FormSelect name="rail" label="From" options={rails.map((rail) => ({ id: rail, label: rail }))} />
        {kind !== "whole" && kind !== "regulator" && (
          <FormTextField name="count" label="Count" mono inputMode="numeric" autoComplete="off" />
        )}
      </div>
      <Figures kind={kind} />
    </>
  );
}

const HINTS: Record<PowerLineItem["kind"], string> = {
  led: "As on the board: phase lamps.",
  "pull-up": "As on the board: R4, BUSY_N.",
  regulator: "As on the board: U7.",
  fixed: "As on the parts list.",
  whole: "Measured on CON-01, or from its author.",
};

function Figures({ kind }: { kind: Props["kind"] }) {
  if (kind === "led") {
    return (
      <div className="grid gap-4 sm:grid-cols-4">
        <FormQuantityField name="forwardVolts" label="LED drops" placeholder="2 V" />
        <FormQuantityField name="ohm" label="Resistor" placeholder="470 Ω" />
        <FormQuantityField name="litTypical" label="Lit as a rule" />
        <FormQuantityField name="litWorst" label="Lit at most" />
      </div>
    );
  }
  if (kind === "pull-up") {
    return (
      <div className="grid gap-4 sm:grid-cols-4">
        <FormQuantityField name="ohm" label="Resistor" placeholder="4k7" />
        <FormQuantityField name="lowVolts" label="Low level" placeholder="0.4 V" />
        <FormQuantityField name="lowTypical" label="Low as a rule" />
        <FormQuantityField name="lowWorst" label="Low at most" />
      </div>
    );
  }
  if (kind === "regulator") return <RegulatorFields />;
  return (
    <div className="grid gap-4 sm:grid-cols-3">
      <FormQuantityField name="typicalA" label="As a rule" placeholder="120 mA" description={each(kind)} />
      <FormQuantityField name="worstA" label="At most" placeholder="180 mA" description={each(kind)} />
      {kind === "fixed" && (
        <FormQuantityField name="atRest" label="Flows without a clock" description="Share of the first figure." />
      )}
    </div>
  );
}

const each = (kind: Props["kind"]) => (kind === "fixed" ? "Of one." : "Of the whole board.");

function RegulatorFields() {
  const type: unknown = useWatch({ name: "type" });
  return (
    <>
      <div className="grid gap-4 sm:grid-cols-3">
        <FormTextField name="output" label="Makes the rail" mono autoComplete="off" placeholder="+3V3" />
        <FormQuantityField name="outputVolts" label="At" placeholder="3.3 V" />
        {type === "linear" ? (
          <FormQuantityField name="groundA" label="Takes for itself" placeholder="5 mA" />
        ) : (
          <FormQuantityField name="efficiency" label="Efficiency" placeholder="85 %" />
        )}
      </div>
      <FormRadioGroup
        name="type"
        label="How it works"
        isInRow
        options={[
          { id: "linear", label: "Linear: passes the current on" },
          { id: "switching", label: "Switching: passes the power on" },
        ]}
      />
    </>
  );
}
