import type { Precision } from "@/calculators/length";
import type { Locale } from "@/lib/client/i18n/locales";
import { createTranslate, type Messages } from "@/lib/client/i18n/translate";
import type { SillSet } from "@/lib/client/set/schema";
import type { SheetFonts } from "@/lib/client/sheet/pdf/make-pdf";
import type { FontRole, Paper } from "@/lib/client/sheet/sheet";

const roles: readonly FontRole[] = ["heading", "text", "bold", "figure", "figure-bold"];

interface Wanted {
  locale: Locale;
  messages: Messages;
  precision: Precision;
  paper: Paper;
}

async function fetchFonts(): Promise<SheetFonts> {
  const fonts = await Promise.all(
    roles.map(async (role) => {
      const response = await fetch(`/fonts/sheet-${role}.ttf`);
      if (!response.ok) throw new Error(`The font ${role} answered ${response.status}`);
      return [role, new Uint8Array(await response.arrayBuffer())] as const;
    }),
  );
  return Object.fromEntries(fonts) as unknown as SheetFonts;
}

/** Makes the field sheet's PDF in this browser and hands it to the downloads. Its writer and fonts are fetched when first asked for; the service worker keeps them. */
export async function saveSheetPdf(set: SillSet, { locale, messages, precision, paper }: Wanted): Promise<void> {
  const [{ makePdf }, { sheetOf, stages }, fonts] = await Promise.all([import("@/lib/client/sheet/pdf/make-pdf"), import("./sheet-core"), fetchFonts()]);
  const now = new Date();
  const sheet = sheetOf(set, { stages, t: createTranslate(locale, messages), precision, paper, now, origin: window.location.origin });
  const bytes = await makePdf(sheet, fonts, now);
  const address = URL.createObjectURL(new Blob([bytes as BlobPart], { type: "application/pdf" }));
  const link = document.createElement("a");
  link.href = address;
  link.download = `${set.name.normalize("NFKD").replace(/[^\w]+/g, "-").replace(/^-|-$/g, "").toLowerCase() || "sheet"}-${paper}.pdf`;
  link.click();
  setTimeout(() => URL.revokeObjectURL(address), 10_000);
}
