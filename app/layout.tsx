import type { Metadata, Viewport } from "next";
import { cookies } from "next/headers";
import type { ReactNode } from "react";
import { asTheme, THEME_COOKIE } from "@/components/ui/theme";
import { faces } from "./fonts";
import "./globals.css";

const description =
  "Build log and bring-up tracker for machines made of several circuit boards: what was measured, what it proves, what to do next.";

export const metadata: Metadata = {
  title: { default: "Boardwake", template: "%s · Boardwake" },
  description,
  applicationName: "Boardwake",
  ...(process.env.APP_URL ? { metadataBase: new URL(process.env.APP_URL) } : {}),
  openGraph: { siteName: "Boardwake", title: "Boardwake", description, type: "website" },
  twitter: { card: "summary_large_image" },
  formatDetection: { telephone: false, date: false, address: false, email: false },
};

export const viewport: Viewport = {
  width: "device-width",
  initialScale: 1,
  viewportFit: "cover",
  themeColor: [
    { media: "(prefers-color-scheme: light)", color: "#faf7ef" },
    { media: "(prefers-color-scheme: dark)", color: "#1c1916" },
  ],
};

export default async function RootLayout({ children }: { children: ReactNode }) {
  const theme = asTheme((await cookies()).get(THEME_COOKIE)?.value);
  return (
    <html lang="en-GB" data-theme={theme} className={faces}>
      <body>{children}</body>
    </html>
  );
}
