"use client";

import en from "@/lib/client/messages/en/failure.json";
import es from "@/lib/client/messages/es/failure.json";
import { fontClasses } from "./fonts";
import "./globals.css";

/** When even the layout broke there is no language to read: both are said. */
export default function GlobalError({ reset }: { error: Error; reset: () => void }) {
  return (
    <html lang="en" className={fontClasses}>
      <body>
        <title>{en.title}</title>
        <main className="page page-narrow prose">
          {[
            { lang: "en", texts: en },
            { lang: "es", texts: es },
          ].map(({ lang, texts }) => (
            <section key={lang} lang={lang} className="prose">
              <h1>{texts.title}</h1>
              <p>{texts.text}</p>
              <p>
                <button type="button" className="btn" onClick={reset}>
                  {texts.again}
                </button>
              </p>
            </section>
          ))}
        </main>
      </body>
    </html>
  );
}
