"use client";

import { useRouter } from "next/navigation";
import { useState } from "react";
import { Button } from "@/components/ui/Button";
import { QuantityField } from "@/components/ui/QuantityField";
import { useSubmit } from "@/components/ui/form/useSubmit";
import { toast } from "@/components/ui/toast-store";
import type { PartsListView } from "@/lib/parts-list/load-parts-list";
import type { SparesAct } from "./parts-acts";

type Props = { project: string; spares: PartsListView["spares"]; save: SparesAct };

/** The share of spares, kept with Enter. Made anew when somebody saved it, so that it never holds an old version. */
export function SparesForm({ project, spares, save }: Props) {
  const router = useRouter();
  const before = `${spares.percent} %`;
  const [typed, setTyped] = useState(before);
  const { submit, isPending, error } = useSubmit(save, {
    onDone: () => {
      toast({ text: "The spares are counted anew." });
      router.refresh();
    },
  });
  return (
    <form
      noValidate
      aria-label="Spares"
      className="flex items-end gap-2 sm:ml-auto"
      onSubmit={(event) => {
        event.preventDefault();
        void submit({ project, writeId: crypto.randomUUID(), version: spares.version, percent: typed });
      }}
    >
      <QuantityField
        label="Spares"
        className="w-28"
        value={typed}
        onChange={setTyped}
        maxLength={10}
        error={error?.fields?.percent ?? error?.message}
      />
      {typed.trim() !== before && (
        <Button type="submit" isPending={isPending}>
          Count anew
        </Button>
      )}
    </form>
  );
}
