"use client";

import { useRouter } from "next/navigation";
import { useWriteId } from "@/components/account/use-write-id";
import { Badge } from "@/components/ui/Badge";
import { DateTime, writeDate } from "@/components/ui/DateTime";
import { FormCheckbox, FormComboBox, FormRadioGroup, FormSelect } from "@/components/ui/form/bound-fields";
import { Form } from "@/components/ui/form/Form";
import type { Reply } from "@/components/ui/form/reply";
import type { Option } from "@/components/ui/option";
import { Panel } from "@/components/ui/Panel";
import { toast } from "@/components/ui/toast-store";
import { updateSubscriptionInput, type UpdateSubscriptionTyped } from "@/lib/digest/subscription-schema";
import { HOURS, QUIET_WEEKS, WEEKDAYS } from "./digest-options";

export type Subscription = {
  project: string;
  projectName: string;
  enabled: boolean;
  weekday: number;
  hour: number;
  zone: string;
  quietWeek: "line" | "nothing";
  nextDueAt: Date | null;
};
export type Save = (input: UpdateSubscriptionTyped) => Promise<Reply<{ nextDueAt: string }>>;
type Props = { subscription: Subscription; zones: readonly Option[]; save: Save };

export function SubscriptionForm({ subscription, zones, save }: Props) {
  const router = useRouter();
  const { writeId, renew } = useWriteId();
  const { project, projectName, enabled, weekday, hour, zone, quietWeek, nextDueAt } = subscription;
  const defaults: UpdateSubscriptionTyped = {
    project,
    writeId,
    enabled,
    weekday: String(weekday),
    hour: String(hour),
    zone,
    quietWeek,
  };
  return (
    <Panel
      title={projectName}
      note={
        nextDueAt ? (
          <>
            next on <DateTime at={nextDueAt} zone={zone} />
          </>
        ) : (
          <Badge>off</Badge>
        )
      }
    >
      <Form
        label={`Weekly e-mail of ${projectName}`}
        schema={updateSubscriptionInput}
        defaults={defaults}
        action={(values) => save({ ...values, project, writeId })}
        onDone={({ nextDueAt: due }, values) => {
          renew();
          toast({
            text: values.enabled
              ? `The next e-mail of ${projectName} comes on ${writeDate(due, values.zone)}.`
              : `No weekly e-mail of ${projectName} any more.`,
          });
          router.refresh();
        }}
        submitLabel="Save"
      >
        <FormCheckbox name="enabled" label="Send me this e-mail" />
        <div className="grid gap-4 sm:grid-cols-[1fr_8rem_1.4fr]">
          <FormSelect name="weekday" label="Day" options={WEEKDAYS} />
          <FormSelect name="hour" label="Hour" options={HOURS} />
          <FormComboBox name="zone" label="Time zone" options={zones} />
        </div>
        <FormRadioGroup name="quietWeek" label="In a week in which nothing happened" options={QUIET_WEEKS} />
      </Form>
    </Panel>
  );
}
