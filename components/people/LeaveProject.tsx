"use client";

import { useRouter } from "next/navigation";
import { useWriteId } from "@/components/account/use-write-id";
import { Button } from "@/components/ui/Button";
import { ConfirmDialog } from "@/components/ui/ConfirmDialog";
import { reach, type Reply } from "@/components/ui/form/reply";
import { toast } from "@/components/ui/toast-store";

type Props = {
  project: string;
  projectName: string;
  isLast: boolean;
  leave: (input: { project: string; writeId: string }) => Promise<Reply<null>>;
};

export function LeaveProject({ project, projectName, isLast, leave }: Props) {
  const router = useRouter();
  const { writeId } = useWriteId();

  async function go(): Promise<string | void> {
    const reply = await reach(() => leave({ project, writeId }));
    if (!reply.ok) return reply.error.message;
    toast({ text: `You have left ${projectName}.` });
    router.replace("/projects");
  }

  if (isLast) {
    return (
      <p className="px-1 text-sm text-ink-soft">
        You are the last maintainer. To leave, make somebody else maintainer first, or archive the project in its
        settings.
      </p>
    );
  }
  return (
    <div>
      <ConfirmDialog
        title={`Leave ${projectName}?`}
        trigger={<Button kind="danger">Leave the project</Button>}
        consequences={[
          "You see nothing of the project from now on, and its weekly e-mail ends.",
          "What you recorded, attached and wrote stays, with your name.",
          "Only a new invitation brings you back.",
        ]}
        confirmLabel="Leave the project"
        onConfirm={go}
      />
    </div>
  );
}
