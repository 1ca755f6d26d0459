"use client";

import { useRouter } from "next/navigation";
import { useState } from "react";
import type { z } from "zod";
import { Button } from "@/components/ui/Button";
import { Dialog } from "@/components/ui/Dialog";
import { FormRadioGroup, FormSelect, FormTextField } from "@/components/ui/form/bound-fields";
import { Form } from "@/components/ui/form/Form";
import { toast } from "@/components/ui/toast-store";
import { sayBoardOrderInput } from "@/lib/order/schema";
import type { BoardOrderActs } from "./order-acts";

type Values = z.input<typeof sayBoardOrderInput>;

const RULES = [
  { id: "needs", label: "waits for", description: "It comes after the other, also where no line joins them." },
  {
    id: "despite",
    label: "may come before",
    description: "It goes first though the other drives or supplies it. Say why that is safe.",
  },
];

type Props = {
  boards: readonly { id: string; code: string; name: string }[];
  project: string;
  say: BoardOrderActs["say"];
};

/** Says of two boards which comes first; the answer to a circle names its members and leaves the form as it is. */
export function SayOrderDialog({ boards, project, say }: Props) {
  const router = useRouter();
  const options = boards.map(({ id, code, name }) => ({ id, label: `${code} ${name}` }));
  return (
    <Dialog title="Which board comes first?" isDismissable={false} trigger={<Button>Say what comes first</Button>}>
      {(close) => (
        <SayForm
          {...{ options, project, say }}
          onCancel={close}
          onDone={() => {
            close();
            toast({ text: "The order of the boards was worked out again." });
            router.refresh();
          }}
        />
      )}
    </Dialog>
  );
}

type FormProps = {
  options: readonly { id: string; label: string }[];
  project: string;
  say: BoardOrderActs["say"];
  onCancel: () => void;
  onDone: () => void;
};

function SayForm({ options, project, say, onCancel, onDone }: FormProps) {
  const [writeId] = useState(() => crypto.randomUUID());
  return (
    <Form<Values, unknown>
      label="Which board comes first"
      schema={sayBoardOrderInput}
      defaults={{ project, writeId, boardId: "", otherId: "", rule: "needs", reason: "" }}
      action={say}
      onDone={onDone}
      submitLabel="Keep it"
      actions={<Button onPress={onCancel}>Cancel</Button>}
    >
      <FormSelect name="boardId" label="This board" options={options} />
      <FormRadioGroup name="rule" label="Rule" options={RULES} />
      <FormSelect name="otherId" label="The other board" options={options} />
      <FormTextField name="reason" label="Reason" autoComplete="off" />
    </Form>
  );
}
