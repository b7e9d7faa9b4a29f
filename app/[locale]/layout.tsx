import type { Metadata, Viewport } from "next";
import { notFound } from "next/navigation";
import type { ReactNode } from "react";
import { SiteFooter } from "@/components/site/site-footer";
import { SiteHeader } from "@/components/site/site-header";
import { env } from "@/lib/env";
import { getTranslate, loadMessages } from "@/lib/client/i18n/load-messages";
import { isLocale, locales } from "@/lib/client/i18n/locales";
import { MessagesProvider } from "@/lib/client/i18n/messages-context";
import { settingsScript } from "@/lib/client/settings/settings-script";
import { fontClasses } from "../fonts";
import "../globals.css";

export const dynamicParams = false;

export function generateStaticParams() {
  return locales.map((locale) => ({ locale }));
}

export const metadata: Metadata = {
  metadataBase: new URL(env.SITE_URL),
  applicationName: "Sillwright",
  formatDetection: { telephone: false, date: false, address: false, email: false },
  icons: { icon: [{ url: "/icons/icon.svg", type: "image/svg+xml" }], apple: "/icons/apple-touch-icon.png" },
};

export const viewport: Viewport = {
  width: "device-width",
  initialScale: 1,
  themeColor: [
    { media: "(prefers-color-scheme: light)", color: "#fbfaf8" },
    { media: "(prefers-color-scheme: dark)", color: "#18212a" },
  ],
};

export default async function Layout({ children, params }: { children: ReactNode; params: Promise<{ locale: string }> }) {
  const { locale } = await params;
  if (!isLocale(locale)) notFound();
  const t = getTranslate(locale, ["common"]);
  return (
    // The script below sets data-theme and data-units before React sees the element.
    <html lang={locale} className={fontClasses} suppressHydrationWarning>
      <head>
        <script dangerouslySetInnerHTML={{ __html: settingsScript }} />
      </head>
      <body>
        <MessagesProvider locale={locale} messages={loadMessages(locale, ["common", "failure"])}>
          <SiteHeader t={t} />
          {children}
          <SiteFooter t={t} />
        </MessagesProvider>
      </body>
    </html>
  );
}
