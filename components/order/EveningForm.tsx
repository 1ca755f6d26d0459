"use client";

import Form from "next/form";
import { useState } from "react";
import { Button } from "@/components/ui/Button";
import { RadioGroup } from "@/components/ui/RadioGroup";
import { TextField } from "@/components/ui/TextField";
import { useIsReady } from "@/components/ui/use-is-ready";

type Props = { project: string; time: string; error: string | null; builders: 1 | 2 };

const BUILDERS = [
  { id: "1", label: "One" },
  { id: "2", label: "Two" },
];

/** How long one has and how many there are; the answer is an address that can be sent to the other one. */
export function EveningForm({ project, time, error, builders }: Props) {
  const [chosen, choose] = useState(String(builders));
  const isReady = useIsReady();
  return (
    <Form
      action={`/projects/${project}/order`}
      aria-label="Plan the evening"
      className="flex flex-wrap items-start gap-x-5 gap-y-3"
    >
      <TextField
        name="time"
        label="Time there is"
        defaultValue={time}
        autoComplete="off"
        description="45 minutes, 1 h, 1 h 30"
        className="w-44"
        {...(error ? { error } : {})}
      />
      <RadioGroup
        name="builders"
        label="Builders at the bench"
        options={BUILDERS}
        value={chosen}
        onChange={choose}
        isInRow
      />
      <Button type={isReady ? "submit" : "button"} kind="primary" className="sm:mt-6.5">
        Plan the evening
      </Button>
    </Form>
  );
}
