"use client";

import { Button } from "@/components/ui/Button";
import type { BenchFormProps } from "../kind";
import type { StatedEntry } from "../stated-verdict";
import type { Spec } from "./schema";

export function BenchForm({ onSubmit, busy }: BenchFormProps<Spec, StatedEntry>) {
  return (
    <div className="grid gap-3">
      <Button isDisabled={busy} onPress={() => onSubmit({ conforms: true })}>
        Conforms
      </Button>
      <Button isDisabled={busy} onPress={() => onSubmit({ conforms: false })}>
        Does not conform
      </Button>
    </div>
  );
}
