"use client";

import { QueryClient, QueryClientProvider } from "@tanstack/react-query";
import { useRouter } from "next/navigation";
import { NuqsAdapter } from "nuqs/adapters/next/app";
import { useState, type ReactNode } from "react";
import { I18nProvider, RouterProvider } from "react-aria-components";
import { ToastRegion } from "@/components/ui/ToastRegion";

/** One language on server and client: the reader's own locale would make the first client render differ. */
const LOCALE = "en-GB";

/** For every place but the bench, which stays light and needs none of it. */
export function Providers({ children }: { children: ReactNode }) {
  const router = useRouter();
  const [client] = useState(() => new QueryClient({ defaultOptions: { queries: { staleTime: 5_000, retry: 1 } } }));
  return (
    <QueryClientProvider client={client}>
      <NuqsAdapter>
        <I18nProvider locale={LOCALE}>
          <RouterProvider navigate={(path) => router.push(path)}>
            {children}
            <ToastRegion />
          </RouterProvider>
        </I18nProvider>
      </NuqsAdapter>
    </QueryClientProvider>
  );
}
