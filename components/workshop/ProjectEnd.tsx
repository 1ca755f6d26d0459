"use client";

import { useRouter } from "next/navigation";
import { Button } from "@/components/ui/Button";
import { ConfirmDialog } from "@/components/ui/ConfirmDialog";
import { Panel } from "@/components/ui/Panel";
import type { Reply } from "@/components/ui/form/reply";
import { toast } from "@/components/ui/toast-store";
import type { ProjectSettingsView } from "@/lib/project/load-settings";
import { counted } from "./counted";
import { PurgeDialog } from "./PurgeDialog";

type Write = { project: string; writeId: string };
export type ProjectEndActions = {
  archive: (input: Write) => Promise<Reply<unknown>>;
  restore: (input: Write) => Promise<Reply<unknown>>;
  purge: (input: Write & { confirmation: string }) => Promise<Reply<unknown>>;
};

type Props = { project: string; settings: ProjectSettingsView; actions: ProjectEndActions };

/** Putting the project away, bringing it back, and removing it for good. */
export function ProjectEnd({ project, settings, actions }: Props) {
  const router = useRouter();
  const say = (text: string) => {
    toast({ text });
    router.refresh();
  };

  async function restore() {
    const reply = await actions.restore({ project, writeId: crypto.randomUUID() });
    if (reply.ok) say("The project is back.");
    else toast({ text: reply.error.message, kind: "error" });
  }

  if (!settings.archived) {
    return (
      <Panel title="Put the project away">
        <p className="max-w-prose text-[0.9375rem] text-ink-soft">
          An archived project can be looked at and restored. Nothing in it can be changed, and its weekly e-mail stops.
        </p>
        <div className="mt-4">
          <ConfirmDialog
            title={`Archive ${settings.name}?`}
            trigger={<Button>Archive the project</Button>}
            kind="primary"
            consequences={[
              "Everybody can still look at it; nobody can record, attach or change anything.",
              "The weekly e-mail stops until it is restored.",
              "A maintainer can restore it at any time. Nothing is lost.",
            ]}
            confirmLabel="Archive the project"
            onConfirm={async () => {
              const reply = await actions.archive({ project, writeId: crypto.randomUUID() });
              if (!reply.ok) return reply.error.message;
              toast({ text: "The project is archived.", undo: { run: restore } });
              router.refresh();
            }}
          />
        </div>
      </Panel>
    );
  }
  return (
    <Panel title="Bring the project back, or remove it">
      <p className="max-w-prose text-[0.9375rem] text-ink-soft">
        Restored, it goes on where it stopped. Purged, it is gone for everybody, and nobody can bring it back.
      </p>
      <div className="mt-4 flex flex-wrap gap-2">
        <Button kind="primary" onPress={() => void restore()}>
          Restore the project
        </Button>
        <PurgeDialog
          what="the project"
          name={settings.name}
          ask={`Type the name of the project: ${settings.name}`}
          consequences={whatGoes(settings)}
          purge={(asked) => actions.purge({ project, ...asked })}
          onGone={() => router.push("/projects")}
        />
      </div>
    </Panel>
  );
}

function whatGoes({ holds }: ProjectSettingsView): string[] {
  return [
    `${counted(holds.boards, "board")} and ${counted(holds.units, "unit")} go, with their procedures and travelers.`,
    `${counted(holds.attempts, "attempt")} with every reading go. They are kept nowhere else.`,
    `${counted(holds.files, "file")} and ${counted(holds.logEntries, "log entry", "log entries")} go.`,
    `${counted(holds.members, "member loses", "members lose")} access.`,
  ];
}
