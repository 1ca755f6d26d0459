import type { ReactNode } from "react";
import { OrderTabs } from "@/components/order/OrderTabs";

type Props = { children: ReactNode; params: Promise<{ project: string }> };

export default async function OrderLayout({ children, params }: Props) {
  const { project } = await params;
  return (
    <>
      <div className="mx-auto max-w-sheet px-4 pt-3 sm:px-6 print:hidden">
        <OrderTabs project={project} />
      </div>
      {children}
    </>
  );
}
