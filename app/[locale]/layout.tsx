import type { Metadata, Viewport } from "next";
import { notFound } from "next/navigation";
import type { ReactNode } from "react";
import { OfflineReady } from "@/components/site/offline-ready";
import { SiteFooter } from "@/components/site/site-footer";
import { SiteHeader } from "@/components/site/site-header";
import { env } from "@/lib/env";
import { getTranslate, loadMessages } from "@/lib/client/i18n/load-messages";
import { isLocale, localePath, locales } from "@/lib/client/i18n/locales";
import type { LocaleProps } from "@/lib/client/i18n/page-locale";
import { MessagesProvider } from "@/lib/client/i18n/messages-context";
import { settingsScript } from "@/lib/client/settings/settings-script";
import { fontClasses } from "../fonts";
import "../globals.css";

export const dynamicParams = false;

export function generateStaticParams() {
  return locales.map((locale) => ({ locale }));
}

export async function generateMetadata({ params }: LocaleProps): Promise<Metadata> {
  const { locale } = await params;
  return {
    metadataBase: new URL(env.SITE_URL),
    applicationName: "Sillwright",
    formatDetection: { telephone: false, date: false, address: false, email: false },
    icons: { icon: [{ url: "/icons/icon.svg", type: "image/svg+xml" }], apple: "/icons/apple-touch-icon.png" },
    manifest: isLocale(locale) ? localePath(locale, "/manifest.webmanifest") : undefined,
  };
}

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
          <OfflineReady />
        </MessagesProvider>
      </body>
    </html>
  );
}
