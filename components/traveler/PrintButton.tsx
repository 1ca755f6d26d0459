"use client";

import { Button } from "@/components/ui/Button";
import { Icon } from "@/components/ui/Icon";

export function PrintButton() {
  return (
    <Button kind="primary" onPress={() => print()}>
      <Icon name="print" /> Print
    </Button>
  );
}
