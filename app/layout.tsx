import "./globals.css";
import { type Metadata, type Viewport } from "next";
import { type ReactNode } from "react";
import { AppFrame } from "@/components/frame/app-frame";
import { earlyScript } from "@/lib/workshop/theme";

export const metadata: Metadata = {
  title: { default: "Notchbook", template: "%s · Notchbook" },
  description: "Clients, figures, sleeves, orders and money for a seamstress, on her phone, with no line.",
  applicationName: "Notchbook",
  icons: { icon: "/icons/icon.svg", apple: "/icons/apple-touch-180.png" },
  appleWebApp: { capable: true, title: "Notchbook", statusBarStyle: "default" },
  formatDetection: { telephone: false, date: false, address: false, email: false },
};

export const viewport: Viewport = {
  width: "device-width",
  initialScale: 1,
  viewportFit: "cover",
  themeColor: [
    { media: "(prefers-color-scheme: light)", color: "#e8d9b8" },
    { media: "(prefers-color-scheme: dark)", color: "#101c33" },
  ],
};

export default function RootLayout({ children }: { children: ReactNode }) {
  return (
    <html lang="en" suppressHydrationWarning>
      <head>
        {/* Before the first paint: the chosen theme, and the browser's offer to install, which comes once and early. */}
        <script dangerouslySetInnerHTML={{ __html: earlyScript }} />
      </head>
      <body>
        <AppFrame>{children}</AppFrame>
      </body>
    </html>
  );
}
