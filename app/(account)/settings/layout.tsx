import type { ReactNode } from "react";
import { WorkshopHeader } from "@/app/(workshop)/WorkshopHeader";

export default function SettingsLayout({ children }: { children: ReactNode }) {
  return (
    <>
      <WorkshopHeader crumbs={[{ label: "Your settings", href: "/settings" }]} />
      {children}
    </>
  );
}
