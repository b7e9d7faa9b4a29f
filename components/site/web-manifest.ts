import { getTranslate } from "@/lib/client/i18n/load-messages";
import { localePath, type Locale } from "@/lib/client/i18n/locales";

/** What a phone installs: one manifest a language, each beginning at its own sets. */
export function webManifest(locale: Locale): Response {
  const t = getTranslate(locale, ["common"]);
  const icon = (size: number, purpose: "any" | "maskable") => ({ src: `/icons/${purpose === "maskable" ? "maskable" : "icon"}-${size}.png`, sizes: `${size}x${size}`, type: "image/png", purpose });
  return Response.json(
    {
      id: localePath(locale, "/"),
      name: t("common.name"),
      short_name: t("common.name"),
      description: t("common.tagline"),
      lang: locale,
      start_url: localePath(locale, "/set"),
      scope: "/",
      display: "standalone",
      background_color: "#f4f2ee",
      theme_color: "#fbfaf8",
      icons: [icon(192, "any"), icon(512, "any"), icon(192, "maskable"), icon(512, "maskable"), { src: "/icons/icon.svg", sizes: "any", type: "image/svg+xml" }],
    },
    { headers: { "Content-Type": "application/manifest+json" } },
  );
}
