"use client";

import { useRouter } from "next/navigation";
import { useRef } from "react";
import { ButtonLink } from "@/components/ui/ButtonLink";
import { Form } from "@/components/ui/form/Form";
import type { Reply } from "@/components/ui/form/reply";
import { createProjectInput } from "@/lib/project/schema";
import type { z } from "zod";
import { ProjectFields, type ZoneOption } from "./ProjectFields";

type Input = z.input<typeof createProjectInput>;
type Props = {
  zones: readonly ZoneOption[];
  timeZone: string;
  create: (input: Input) => Promise<Reply<{ slug: string }>>;
};

type Fields = Omit<Input, "writeId">;

const fields = createProjectInput.omit({ writeId: true });

export function NewProject({ zones, timeZone, create }: Props) {
  const router = useRouter();
  const writeId = useRef(crypto.randomUUID());
  return (
    <Form<Fields, { slug: string }>
      label="New project"
      schema={fields}
      defaults={{ name: "", summary: "", layout: "tower", decisionRule: "guarded", timeZone }}
      action={(values) => create({ ...values, writeId: writeId.current })}
      onDone={({ slug }) => router.push(`/projects/${slug}/rack`)}
      submitLabel="Set the project up"
      actions={<ButtonLink href="/projects">Not now</ButtonLink>}
    >
      <ProjectFields zones={zones} />
    </Form>
  );
}
