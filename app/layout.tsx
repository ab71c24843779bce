import type { Metadata, Viewport } from "next";
import { cookies } from "next/headers";
import type { ReactNode } from "react";
import { preload } from "react-dom";
import { readTheme } from "@/components/shell/theme";
import "./globals.css";

export const metadata: Metadata = {
  title: { default: "Coppertell", template: "%s · Coppertell" },
  description: "Read the strike before the final plate goes on.",
  formatDetection: { telephone: false },
};

export const viewport: Viewport = { width: "device-width", initialScale: 1, themeColor: "#14212f" };

const FONTS = [
  "bricolage-grotesque-latin-wdth-normal",
  "atkinson-hyperlegible-next-latin-wght-normal",
  "atkinson-hyperlegible-mono-latin-wght-normal",
];

/** The theme is read from the cookie here, so that the first paint already has it. */
export default async function RootLayout({ children }: { children: ReactNode }) {
  for (const font of FONTS)
    preload(`/fonts/${font}.woff2`, { as: "font", type: "font/woff2", crossOrigin: "anonymous" });
  const theme = readTheme((await cookies()).get("theme")?.value);
  return (
    <html lang="en" data-theme={theme} suppressHydrationWarning>
      <body>{children}</body>
    </html>
  );
}
