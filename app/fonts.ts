import localFont from "next/font/local";

/** Headings: Archivo with its width axis; licence in public/fonts/OFL.txt. */
const heading = localFont({
  src: "./fonts/archivo.woff2",
  variable: "--font-heading",
  weight: "100 900",
  declarations: [{ prop: "font-stretch", value: "62% 125%" }],
  display: "swap",
});

const text = localFont({ src: "./fonts/atkinson-next.woff2", variable: "--font-text", weight: "200 800", display: "swap" });

/** Figures: no substitute is measured for it, since no system face has its widths. */
const figures = localFont({
  src: "./fonts/atkinson-mono.woff2",
  variable: "--font-figures",
  weight: "200 800",
  display: "swap",
  adjustFontFallback: false,
});

export const fontClasses = `${heading.variable} ${text.variable} ${figures.variable}`;
