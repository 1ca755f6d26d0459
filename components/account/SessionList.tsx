"use client";

import { useRouter } from "next/navigation";
import { Badge } from "@/components/ui/Badge";
import { Button } from "@/components/ui/Button";
import { ConfirmDialog } from "@/components/ui/ConfirmDialog";
import { DateTime } from "@/components/ui/DateTime";
import { reach, type Reply } from "@/components/ui/form/reply";
import { useSubmit } from "@/components/ui/form/useSubmit";
import { toast } from "@/components/ui/toast-store";

type Line = { id: string; where: string; since: Date; isThis: boolean };
type Acts = {
  zone: string;
  endSession: (input: { session: string }) => Promise<Reply<null>>;
  endAll: (input: Record<string, never>) => Promise<Reply<{ ended: number }>>;
};

export function SessionList({ sessions, ...acts }: Acts & { sessions: readonly Line[] }) {
  return (
    <>
      <ul aria-label="Sessions" className="px-4 sm:px-5">
        {sessions.map((session) => (
          <li
            key={session.id}
            className="flex flex-wrap items-center justify-between gap-x-4 gap-y-2 border-t border-rule py-2.5"
          >
            <Session session={session} {...acts} />
          </li>
        ))}
      </ul>
      <div className="border-t border-rule px-4 py-3.5 sm:px-5">
        <EndAll endAll={acts.endAll} />
      </div>
    </>
  );
}

function Session({ session, zone, endSession }: Acts & { session: Line }) {
  const router = useRouter();
  const { submit, isPending } = useSubmit(endSession, {
    onDone: () => {
      toast({ text: `The session on ${session.where} has ended.` });
      router.refresh();
    },
  });

  async function end() {
    const reply = await submit({ session: session.id });
    if (!reply.ok) toast({ kind: "error", text: reply.error.message });
  }

  return (
    <>
      <div className="min-w-0">
        <p className="flex flex-wrap items-center gap-2 font-semibold">
          {session.where} {session.isThis && <Badge tone="passed">this session</Badge>}
        </p>
        <p className="text-sm text-ink-soft">
          Since <DateTime at={session.since} zone={zone} />
        </p>
      </div>
      {!session.isThis && (
        <Button size="sm" isPending={isPending} onPress={() => void end()} aria-label={`Sign out on ${session.where}`}>
          Sign out there
        </Button>
      )}
    </>
  );
}

function EndAll({ endAll }: Pick<Acts, "endAll">) {
  const router = useRouter();
  async function end(): Promise<string | void> {
    const reply = await reach(() => endAll({}));
    if (!reply.ok) return reply.error.message;
    router.replace("/sign-in");
  }
  return (
    <ConfirmDialog
      title="Sign out everywhere?"
      trigger={<Button kind="danger">Sign out everywhere</Button>}
      consequences={[
        "Every session ends at once, this one too.",
        "Checks that are held on a device stay there and go out when you sign in on it again.",
      ]}
      confirmLabel="Sign out everywhere"
      onConfirm={end}
    />
  );
}
