import type { ReactNode } from "react";
import { WorkshopHeader } from "../../WorkshopHeader";

export default function MyProjectsLayout({ children }: { children: ReactNode }) {
  return (
    <>
      <WorkshopHeader crumbs={[{ label: "Projects", href: "/projects" }]} />
      {children}
    </>
  );
}
