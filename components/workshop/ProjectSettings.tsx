"use client";

import { useRouter } from "next/navigation";
import type { z } from "zod";
import { Form } from "@/components/ui/form/Form";
import type { Reply } from "@/components/ui/form/reply";
import { toast } from "@/components/ui/toast-store";
import type { ProjectSettingsView } from "@/lib/project/load-settings";
import { currentProject, editProjectInput } from "@/lib/project/schema";
import { ProjectFields, type ZoneOption } from "./ProjectFields";
import { TheirVersion } from "./TheirVersion";
import { useStaleEdit } from "./use-stale-edit";

type Input = z.input<typeof editProjectInput>;
type Props = {
  project: string;
  settings: ProjectSettingsView;
  zones: readonly ZoneOption[];
  edit: (input: Input) => Promise<Reply<{ version: number }>>;
};

const fields = editProjectInput.omit({ project: true, writeId: true, version: true });

export function ProjectSettings({ project, settings, zones, edit }: Props) {
  const router = useRouter();
  const stale = useStaleEdit(settings.version, (details) => currentProject.safeParse(details).data);
  const { name, summary, layout, decisionRule, timeZone } = settings;
  return (
    <Form
      label="Settings of the project"
      schema={fields}
      defaults={{ name, summary, layout, decisionRule, timeZone }}
      action={(values) => stale.send((asked) => edit({ project, ...values, ...asked }))}
      onDone={() => {
        toast({ text: "The settings are saved." });
        router.refresh();
      }}
      submitLabel="Save the settings"
    >
      {(form) => (
        <>
          <ProjectFields zones={zones} />
          {stale.theirs && (
            <TheirVersion
              rows={[
                { name: "Name", theirs: stale.theirs.name, yours: form.getValues("name") },
                { name: "Summary", theirs: stale.theirs.summary, yours: form.getValues("summary") },
                { name: "Cards stand in a", theirs: stale.theirs.layout, yours: form.getValues("layout") },
                {
                  name: "Readings are judged",
                  theirs: stale.theirs.decisionRule,
                  yours: form.getValues("decisionRule"),
                },
                { name: "Time zone", theirs: stale.theirs.timeZone, yours: form.getValues("timeZone") },
              ]}
            />
          )}
        </>
      )}
    </Form>
  );
}
