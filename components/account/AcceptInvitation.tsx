"use client";

import { useRouter } from "next/navigation";
import { Button } from "@/components/ui/Button";
import type { Reply } from "@/components/ui/form/reply";
import { useSubmit } from "@/components/ui/form/useSubmit";
import { Notice } from "@/components/ui/Notice";
import { useWriteId } from "./use-write-id";

type Props = {
  token: string;
  projectName: string;
  accept: (input: { writeId: string; token: string }) => Promise<Reply<{ slug: string }>>;
};

export function AcceptInvitation({ token, projectName, accept }: Props) {
  const router = useRouter();
  const { writeId } = useWriteId();
  const { submit, isPending, error } = useSubmit(accept, {
    onDone: ({ slug }) => router.replace(`/projects/${slug}/rack`),
  });
  return (
    <div className="flex flex-col gap-3">
      {error && <Notice kind="error">{error.message}</Notice>}
      <Button kind="primary" size="lg" isPending={isPending} onPress={() => void submit({ writeId, token })}>
        Join {projectName}
      </Button>
    </div>
  );
}
