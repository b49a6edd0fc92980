import type { Metadata, Viewport } from "next";
import type { ReactNode } from "react";
import { LIGHT_SCRIPT } from "@/components/ui/light-script";
import "./globals.css";

export const metadata: Metadata = {
  title: { default: "Gudgeon", template: "%s · Gudgeon" },
  description: "Find the fault, prove the fix, know when it is back: fault finding for small marine diesels.",
};

export const viewport: Viewport = { width: "device-width", initialScale: 1, viewportFit: "cover" };

/** The root reads neither cookies nor headers, so that the skipper's path stays static. Each page has one <main id="main">. */
export default function RootLayout({ children }: { children: ReactNode }) {
  return (
    <html lang="en" suppressHydrationWarning>
      <head>
        <script dangerouslySetInnerHTML={{ __html: LIGHT_SCRIPT }} />
      </head>
      <body>
        <a
          href="#main"
          className="visually-hidden focus:absolute focus:z-50 focus:m-2 focus:rounded-lg focus:bg-sheet focus:px-4 focus:py-3"
        >
          Skip to the page itself
        </a>
        {children}
      </body>
    </html>
  );
}
