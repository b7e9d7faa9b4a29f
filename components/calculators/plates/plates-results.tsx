"use client";

import type { PlatesAnswer } from "@/calculators/plates";
import { KeyValues } from "@/components/ui/key-values";
import { LengthText } from "@/components/ui/length-text";
import { Note } from "@/components/ui/note";
import { useTranslate } from "@/lib/client/i18n/messages-context";
import { CutList } from "./cut-list";
import { PieceHoles } from "./piece-holes";
import { PlateFindings } from "./plate-findings";
import { percent } from "./plates-verdict";
import { useFold } from "./use-fold";

interface Part {
  answer: PlatesAnswer;
}

/** What is not right yet, anchors to add, joints, the cut list, every piece's holes, and what is proved. */
export function PlatesResults({ answer }: Part) {
  const t = useTranslate();
  const { totals, notes, bit, hole, astride } = answer;
  const said = notes.filter(({ code }) => code !== "no-bolts-given");
  const without = notes.filter(({ code }) => code === "no-bolts-given").map(({ wall }) => wall!.toUpperCase());
  return (
    <>
      <PlateFindings answer={answer} />
      <AnchorTable answer={answer} />
      {said.map(({ code }) => (
        <Note key={code} tone={code === "joints-cost-anchors" ? "plain" : "warn"} title={t(`plates.notes.${code}.title`)}>
          {t.rich(`plates.notes.${code}.body`, { least: <LengthText text={astride?.least.text ?? ""} />, most: <LengthText text={astride?.most.text ?? ""} /> })}
        </Note>
      ))}
      {without.length === 0 ? null : <Note title={t("plates.notes.no-bolts-given.title")}>{t("plates.notes.no-bolts-given.body", { walls: without.join(", "), count: without.length })}</Note>}
      <JointTable answer={answer} />
      <CutList answer={answer} />
      <PieceHoles answer={answer} />
      {answer.walls.length > 0 && bit.warning !== null ? (
        <Note tone="warn" title={t(`plates.bit.${bit.warning}.title`)}>
          {t.rich(`plates.bit.${bit.warning}.body`, { size: <LengthText text={bit.size.text} />, least: <LengthText text={hole.least.text} />, most: <LengthText text={hole.most.text} /> })}
        </Note>
      ) : null}
      <Note title={t("plates.proves.title")}>
        {answer.walls.length === 0 ? null : <p>{t(answer.anchorsProved ? "plates.proves.anchors" : "plates.proves.anchorsNot")}</p>}
        <p>{answer.boardsProved ? t("plates.proves.boards") : t("plates.proves.boardsNot", { share: percent(answer.gap) })}</p>
      </Note>
      <KeyValues
        items={[
          { label: t("plates.totals.boards"), value: totals.boards },
          { label: t("plates.totals.boardLength"), value: <LengthText text={totals.boardLength.text} /> },
          { label: t("plates.totals.pieceLength"), value: <LengthText text={totals.pieceLength.text} /> },
          { label: t("plates.totals.waste"), value: t("plates.totals.percent", { share: Math.round(totals.wasteShare * 1000) / 10 }) },
          ...(answer.walls.length === 0 ? [] : [{ label: t("plates.totals.bit"), value: <LengthText text={bit.size.text} /> }]),
        ]}
      />
    </>
  );
}

function AnchorTable({ answer }: Part) {
  const t = useTranslate();
  const [anchors, more] = useFold(answer.addedAnchors, 24);
  if (anchors.length === 0) return null;
  return (
    <section aria-labelledby="added-title">
      <h2 id="added-title">{t("plates.added.title")}</h2>
      <p>{t("plates.added.intro")}</p>
      <div className="overflow-x-auto">
        <table className="data-table">
          <thead>
            <tr>
              <th scope="col">{t("plates.added.piece")}</th>
              <th scope="col" className="figure">{t("plates.added.station")}</th>
              <th scope="col" className="figure">{t("plates.added.running")}</th>
              <th scope="col" className="figure">{t("plates.added.window")}</th>
            </tr>
          </thead>
          <tbody>
            {anchors.map(({ wall, piece, station, running, window }, index) => (
              <tr key={`${wall}${index}`}>
                <th scope="row">{piece}</th>
                <td className="figure">
                  <LengthText text={station.text} />
                </td>
                <td className="figure">
                  <LengthText text={running.text} />
                </td>
                <td className="figure">{window.from.text === window.to.text ? t("plates.added.fixed") : t.rich("plates.added.between", { from: <LengthText text={window.from.text} />, to: <LengthText text={window.to.text} /> })}</td>
              </tr>
            ))}
          </tbody>
        </table>
      </div>
      {more}
    </section>
  );
}

function JointTable({ answer }: Part) {
  const t = useTranslate();
  const [joints, more] = useFold(answer.joints, 24);
  if (joints.length === 0) return null;
  return (
    <section aria-labelledby="joints-title">
      <h2 id="joints-title">{t("plates.joints.title")}</h2>
      <p>{t("plates.joints.intro")}</p>
      <div className="overflow-x-auto">
        <table className="data-table">
          <thead>
            <tr>
              <th scope="col">{t("plates.joints.between")}</th>
              <th scope="col" className="figure">{t("plates.joints.at")}</th>
              <th scope="col" className="figure">{t("plates.joints.window")}</th>
            </tr>
          </thead>
          <tbody>
            {joints.map(({ at, window, before, after }) => (
              <tr key={before}>
                <th scope="row">{t("plates.joints.pair", { before, after })}</th>
                <td className="figure">
                  <LengthText text={at.text} />
                </td>
                <td className="figure">{t.rich("plates.added.between", { from: <LengthText text={window.from.text} />, to: <LengthText text={window.to.text} /> })}</td>
              </tr>
            ))}
          </tbody>
        </table>
      </div>
      {more}
    </section>
  );
}
