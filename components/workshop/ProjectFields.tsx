"use client";

import { FormComboBox, FormRadioGroup, FormTextArea, FormTextField } from "@/components/ui/form/bound-fields";

export type ZoneOption = { id: string; label: string };

/** What is asked when a project is set up and when it is changed. */
export function ProjectFields({ zones }: { zones: readonly ZoneOption[] }) {
  return (
    <>
      <FormTextField name="name" label="Name" description="What people call the machine." isRequired maxLength={120} />
      <FormTextArea
        name="summary"
        label="Summary"
        rows={3}
        description="One or two sentences for people who have not seen it: what it does, what it is made of."
      />
      <FormRadioGroup
        name="layout"
        label="How the cards stand"
        description="Decides how the machine is drawn."
        options={[
          {
            id: "tower",
            label: "Tower",
            description: "Cards lie one above the other, the backplane stands upright beside them.",
          },
          { id: "rack", label: "Rack", description: "Cards stand side by side, the backplane runs along their edge." },
        ]}
      />
      <FormRadioGroup
        name="decisionRule"
        label="How readings are judged"
        description="Holds for readings recorded from now on. Verdicts already given stay."
        options={[
          {
            id: "guarded",
            label: "With a guard band",
            description:
              "The uncertainty of the meter is taken off the limits. A reading between the two conforms, but is marked: repeat it with a better instrument.",
          },
          {
            id: "simple",
            label: "By the limits alone",
            description:
              "What lies inside the limits conforms, however coarse the meter. Near a limit that can be wrong by chance.",
          },
        ]}
      />
      <FormComboBox
        name="timeZone"
        label="Time zone"
        description="The machine’s own: days and weeks of the project are counted in it. People see times in theirs."
        options={zones}
      />
    </>
  );
}
