"use client";

import { useRouter } from "next/navigation";
import { FormCheckbox, FormComboBox, FormRadioGroup, FormTextField } from "@/components/ui/form/bound-fields";
import { Form } from "@/components/ui/form/Form";
import type { Reply } from "@/components/ui/form/reply";
import type { Option } from "@/components/ui/option";
import type { Theme } from "@/components/ui/theme";
import { toast } from "@/components/ui/toast-store";
import { profileInput, type ProfileTyped } from "@/lib/account/schema";
import { useWriteId } from "./use-write-id";

type Profile = Omit<ProfileTyped, "writeId"> & { email: string };
type Props = { profile: Profile; zones: readonly Option[]; save: (input: ProfileTyped) => Promise<Reply<null>> };

const THEME_OPTIONS: readonly { id: Theme; label: string }[] = [
  { id: "system", label: "As the device is set" },
  { id: "light", label: "Light" },
  { id: "dark", label: "Dark" },
];

export function ProfileForm({ profile, zones, save }: Props) {
  const router = useRouter();
  const { writeId, renew } = useWriteId();
  const { name, email, timeZone, theme, speakAloud, mailOnReopen } = profile;
  const defaults: ProfileTyped = { writeId, name, timeZone, theme, speakAloud, mailOnReopen };
  return (
    <Form
      label="Profile"
      schema={profileInput}
      defaults={defaults}
      action={(values) => save({ ...values, writeId })}
      onDone={(_done, values) => {
        renew();
        document.documentElement.dataset.theme = values.theme;
        toast({ text: "Your settings are saved." });
        router.refresh();
      }}
      submitLabel="Save"
    >
      <p className="text-[0.9375rem]">
        <span className="block text-sm font-semibold">E-mail address</span>
        <span className="break-all">{email}</span>
        <span className="block text-sm text-ink-soft">You sign in with it. It cannot be changed here.</span>
      </p>
      <FormTextField name="name" label="Name" autoComplete="name" description="As others on a project see it." />
      <FormComboBox
        name="timeZone"
        label="Time zone"
        options={zones}
        description="Dates are shown in it. Each weekly e-mail has a zone of its own."
      />
      <FormRadioGroup name="theme" label="Colours" options={THEME_OPTIONS} isInRow />
      <FormCheckbox
        name="speakAloud"
        label="Read the next instruction aloud at the bench"
        description="For people whose hands hold probes. The voice is the device's own."
      />
      <FormCheckbox
        name="mailOnReopen"
        label="Mail me when a check that I recorded is reopened"
        description="With the maintainer's reason and a link to the check."
      />
    </Form>
  );
}
