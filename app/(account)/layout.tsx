import type { ReactNode } from "react";
import { Providers } from "../Providers";

export default function AccountLayout({ children }: { children: ReactNode }) {
  return <Providers>{children}</Providers>;
}
