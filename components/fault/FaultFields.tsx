"use client";

import { FormRadioGroup, FormTextArea, FormTextField } from "@/components/ui/form/bound-fields";
import { FormNamesField } from "@/components/ui/form/FormNamesField";
import type { BoardNames } from "@/lib/board/load-board-names";
import { STATE_MEANINGS, STATE_WORDS } from "@/lib/fault/fault-words";
import { FAULT_LIMITS, FAULT_STATES } from "@/lib/fault/schema";

type Props = { names: BoardNames };

const STATES = FAULT_STATES.map((id) => ({ id, label: STATE_WORDS[id], description: STATE_MEANINGS[id] }));

/** What was seen. */
export function SymptomFields({ names }: Props) {
  return (
    <>
      <FormTextField
        name="title"
        label="What is wrong"
        placeholder="Bit 8 never comes on"
        maxLength={FAULT_LIMITS.title}
        isRequired
      />
      <FormTextArea name="symptom" label="Symptom" description="What was seen, and when." rows={3} />
      <div className="grid items-start gap-x-5 gap-y-4 sm:grid-cols-2">
        <FormNamesField name="signals" label="Signals" choices={names.signals} placeholder="PH7, CARRY_N" />
        <FormNamesField name="pins" label="Pins" choices={names.pins} placeholder="J1 a14, U6-12" />
      </div>
    </>
  );
}

/** What it turned out to be. All of it may come later. */
export function CauseFields() {
  return (
    <>
      <FormRadioGroup name="state" label="How it stands" options={STATES} />
      <FormTextArea name="suspected" label="Suspected" description="What it could be." rows={2} />
      <FormTextArea name="tried" label="Tried" description="What was done to find it, and what it said." rows={2} />
      <FormTextArea name="cause" label="Cause" description="What it was." rows={2} />
      <FormTextArea name="mend" label="Mend" description="What was done about it." rows={2} />
      <FormTextField
        name="hours"
        label="Time it cost"
        placeholder="1.5 or 0:45"
        autoComplete="off"
        className="sm:max-w-44"
        mono
      />
      <FormTextArea name="lesson" label="Lesson" description="What to look at first next time." rows={2} />
      <FormTextArea
        name="nextRevision"
        label="What the next revision should change"
        description="It goes on the punch list of the next revision."
        rows={2}
      />
    </>
  );
}
