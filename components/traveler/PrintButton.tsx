"use client";

import { Button } from "@/components/ui/Button";
import type { ButtonKind } from "@/components/ui/button-style";
import { Icon } from "@/components/ui/Icon";

export function PrintButton({ kind = "primary" }: { kind?: ButtonKind }) {
  return (
    <Button kind={kind} onPress={() => print()}>
      <Icon name="print" /> Print
    </Button>
  );
}
