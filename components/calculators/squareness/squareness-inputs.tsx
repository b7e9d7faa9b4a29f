"use client";

import type { squarenessAnswer, SquarenessAnswer } from "@/calculators/squareness";
import { LengthField } from "@/components/length-field/length-field";
import { Disclosure } from "@/components/ui/disclosure";
import { Segmented } from "@/components/ui/segmented";
import type { useCalculator } from "@/lib/client/calculator/use-calculator";
import { useTranslate } from "@/lib/client/i18n/messages-context";
import { BurnChoice } from "../burn-choice";
import { burnChosen, burnName } from "../burn-field";
import { diagonals, pullsFourSides, sides } from "./squareness-fields";
import { TapeInputs } from "./tape-inputs";
import { ToleranceChoice } from "./tolerance-choice";

export type SquarenessForm = ReturnType<typeof useCalculator<typeof squarenessAnswer>>;

/** What is typed: two sizes or four sides as read, where the tape was held, both diagonals, and what to judge by. */
export function SquarenessInputs({ form, answer }: { form: SquarenessForm; answer: SquarenessAnswer | null }) {
  const t = useTranslate();
  const four = pullsFourSides(form.value);
  const burn = burnChosen(form.value, form.unit).text;
  const burnFor = (name: string) => form.value(`burns.${name}`) || burn;
  const asRead = (name: string) => (burnFor(name) === "" ? t("squareness.fields.asRead") : t("squareness.fields.burned", { burn: burnName(burnFor(name), t, "squareness") }));
  return (
    <>
      <div className="field">
        <Segmented
          name="pulled"
          legend={t("squareness.fields.pulled")}
          value={four ? "four" : "two"}
          onChange={(pulled) => form.change(moved(form, pulled))}
          options={[
            { value: "two", label: t("squareness.fields.two") },
            { value: "four", label: t("squareness.fields.four") },
          ]}
        />
      </div>
      {four ? (
        <>
          <BurnChoice form={form} namespace="squareness" />
          {sides.map((side) => (
            <LengthField key={side} {...form.field(`sides.${side}`)} label={t("squareness.fields.side", { side: t(`squareness.reading.${side}`) })} hint={asRead(side)} burn={burnFor(side)} />
          ))}
        </>
      ) : (
        <>
          <LengthField {...form.field("length")} label={t("squareness.fields.length")} hint={t("squareness.fields.outside")} />
          <LengthField {...form.field("width")} label={t("squareness.fields.width")} hint={t("squareness.fields.outside")} />
          <BurnChoice form={form} namespace="squareness" />
        </>
      )}
      {diagonals.map((name, index) => (
        <LengthField key={name} {...form.field(`diagonals.${name}`)} label={t("squareness.fields.diagonal", { diagonal: t(`squareness.reading.${name}`) })} hint={asRead(name)} dot={index + 1} burn={burnFor(name)} blade />
      ))}
      {four ? null : <FourSidesWithoutScript />}
      <ToleranceChoice form={form} answer={answer} />
      <Disclosure summary={t("squareness.fields.more")} id="more" open={form.value("taperTolerance") !== "" || form.value("readingError") !== ""}>
        <LengthField {...form.field("taperTolerance")} label={t("squareness.fields.taperTolerance")} hint={t("squareness.fields.taperToleranceHint")} />
        <LengthField {...form.field("readingError")} label={t("squareness.fields.readingError")} hint={t("squareness.fields.readingErrorHint")} />
      </Disclosure>
      <TapeInputs form={form} />
    </>
  );
}

/** The sizes go along as sides, and back, where no burn stands between the two. */
function moved(form: SquarenessForm, pulled: string): Record<string, string> {
  if (burnChosen(form.value, form.unit).text !== "") return { pulled, withoutScript: "" };
  const copy = (from: string, to: string) => (form.value(to) === "" ? { [to]: form.value(from) } : {});
  return pulled === "four"
    ? { pulled, withoutScript: "", ...copy("length", "sides.ab"), ...copy("width", "sides.da") }
    : { pulled, withoutScript: "", ...copy("sides.ab", "length"), ...copy("sides.da", "width") };
}

/** Without script the choice of four sides changes nothing on the page: their fields wait here, folded. */
function FourSidesWithoutScript() {
  const t = useTranslate();
  return (
    <noscript>
      <input type="hidden" name="withoutScript" value="true" />
      <details className="disclosure">
        <summary>{t("squareness.fields.fourTitle")}</summary>
        <div className="disclosure-body">
          {sides.map((side) => (
            <label key={side} className="field squareness-plain">
              <span className="field-label">{t("squareness.fields.side", { side: t(`squareness.reading.${side}`) })}</span>
              <input className="control" type="text" name={`sides.${side}`} autoComplete="off" />
            </label>
          ))}
        </div>
      </details>
    </noscript>
  );
}
