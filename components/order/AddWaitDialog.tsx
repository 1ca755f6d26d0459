"use client";

import { useRouter } from "next/navigation";
import { useState } from "react";
import type { z } from "zod";
import { Button } from "@/components/ui/Button";
import { Dialog } from "@/components/ui/Dialog";
import { FormComboBox } from "@/components/ui/form/bound-fields";
import { Form } from "@/components/ui/form/Form";
import { toast } from "@/components/ui/toast-store";
import type { CheckName } from "@/lib/order/waits-view";
import { prerequisiteInput } from "@/lib/prerequisite/schema";
import { stageName } from "@/lib/procedure/stages";
import type { WaitActs } from "./order-acts";

type Values = z.input<typeof prerequisiteInput>;
type Props = { checks: readonly CheckName[]; project: string; add: WaitActs["add"] };

/** One check waits for another from now on, on whichever unit it stands. */
export function AddWaitDialog({ checks, project, add }: Props) {
  return (
    <Dialog title="Which check waits for which?" isDismissable={false} trigger={<Button>Let a check wait</Button>}>
      {(close) => <WaitForm {...{ checks, project, add }} close={close} />}
    </Dialog>
  );
}

function WaitForm({ checks, project, add, close }: Props & { close: () => void }) {
  const router = useRouter();
  const [writeId] = useState(() => crypto.randomUUID());
  const options = checks.map(({ checkId, serial, title, stage }) => ({
    id: checkId,
    label: `${serial} ${title}`,
    description: stageName(stage),
  }));
  return (
    <Form<Values, unknown>
      label="Which check waits for which"
      schema={prerequisiteInput}
      defaults={{ project, writeId, checkId: "", needsCheckId: "" }}
      action={add}
      onDone={() => {
        close();
        toast({ text: "Added. The check waits until the other one holds." });
        router.refresh();
      }}
      submitLabel="Let it wait"
      actions={<Button onPress={close}>Cancel</Button>}
    >
      <FormComboBox name="checkId" label="This check" options={options} placeholder="Serial or words of its title" />
      <FormComboBox
        name="needsCheckId"
        label="waits for"
        options={options}
        placeholder="Serial or words of its title"
      />
    </Form>
  );
}
