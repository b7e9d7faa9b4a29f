"use client";

import { useEffect, useRef, useState } from "react";
import useSWRMutation from "swr/mutation";
import { Button } from "@/components/ui/button";
import { Note } from "@/components/ui/note";
import type { Translate } from "@/lib/client/i18n/translate";
import { makeShortLink, ProblemAnswered, type ShortLinkRequest } from "./make-short-link";
import { QrCode } from "./qr-code";

interface SendToPhoneProps {
  calculator: string;
  /** The operation's path under /api/v1. */
  operation: string;
  /** The plain input, as the API takes it. */
  input: Record<string, unknown>;
  t: Translate;
}

/** Makes a short link of what is typed and shows it as a square code, as text, and to copy. */
export function SendToPhone({ calculator, operation, input, t }: SendToPhoneProps) {
  const { data, error, isMutating, trigger } = useSWRMutation("/api/v1/links", (_, { arg }: { arg: ShortLinkRequest }) => makeShortLink(arg), { throwOnError: false });
  const [madeOf, setMadeOf] = useState<string | null>(null);
  const wanted = JSON.stringify(input);
  const make = () => {
    setMadeOf(wanted);
    void trigger({ operation, input, language: t.locale });
  };
  // The press that opened this asked for a link already.
  const begun = useRef(false);
  useEffect(() => {
    if (begun.current) return;
    begun.current = true;
    make();
  });

  const changed = data !== undefined && madeOf !== wanted;
  return (
    <section className="send-to-phone" aria-label={t("links.send.title")} data-calculator={calculator}>
      <div role="status">
        {isMutating ? <p>{t("links.send.making")}</p> : null}
        {!isMutating && data !== undefined && !changed ? <p>{t("links.send.ready")}</p> : null}
        {!isMutating && error !== undefined ? <Note tone="warn">{wordsFor(error, t)}</Note> : null}
        {!isMutating && changed ? <Note tone="warn">{t("links.send.changed")}</Note> : null}
      </div>
      {!isMutating && data !== undefined && !changed ? <MadeLink url={data.url} t={t} /> : null}
      {!isMutating && (error !== undefined || changed) ? <Button onClick={make}>{t("links.send.again")}</Button> : null}
    </section>
  );
}

/** What the API says it was, in the page's language; without an answer there is no connection. */
function wordsFor(error: unknown, t: Translate): string {
  return error instanceof ProblemAnswered ? t("links.send.failed", { detail: error.message }) : t("links.send.offline");
}

function MadeLink({ url, t }: { url: string; t: Translate }) {
  const [copied, setCopied] = useState<"copied" | "notCopied" | null>(null);
  const copy = () =>
    void Promise.resolve()
      .then(() => navigator.clipboard.writeText(url)) // absent without TLS
      .then(
        () => setCopied("copied"),
        () => setCopied("notCopied"),
      );
  return (
    <>
      <QrCode text={url} label={t("links.send.qr", { url })} />
      <p>
        <a className="send-to-phone-url num" href={url}>
          {url.replace(/^https?:\/\//, "")}
        </a>
      </p>
      <Button kind="ghost" onClick={copy}>
        <span aria-live="polite">{t(`links.send.${copied ?? "copy"}`)}</span>
      </Button>
      <p className="field-hint">{t("links.send.kept")}</p>
    </>
  );
}
