"use client";

import type { LevelAnswer } from "@/calculators/level";
import { Disclosure } from "@/components/ui/disclosure";
import { KeyValues } from "@/components/ui/key-values";
import { LengthText } from "@/components/ui/length-text";
import { Note } from "@/components/ui/note";
import { Verdict } from "@/components/ui/verdict";
import { useTranslate } from "@/lib/client/i18n/messages-context";

/** The answer in a line: within or out by the pairs, or how far it is from the highest to the lowest. */
export function LevelVerdict({ answer }: { answer: LevelAnswer | null }) {
  const t = useTranslate();
  if (answer === null) return <Verdict tone="idle" title={t("level.verdict.waiting")}>{t("level.verdict.waitingBody")}</Verdict>;
  const { verdict, spread, closes, pairsOut, points } = answer;
  const misses = closes === false ? ` ${t("level.verdict.misses")}` : "";
  const values = { spread: <LengthText text={spread.text} />, pairs: pairsOut };
  if (points.length === 1) return <Verdict tone="plain" title={t.rich("level.verdict.one", { elevation: <LengthText text={answer.high.elevation.text} /> })}>{t("level.verdict.oneBody")}{misses}</Verdict>;
  if (verdict === "within") return <Verdict tone={closes === false ? "warn" : "good"} title={t.rich("level.verdict.within", values)}>{t("level.verdict.withinBody")}{misses}</Verdict>;
  if (verdict === "out") return <Verdict tone="out" title={t.rich("level.verdict.out", values)}>{t("level.verdict.outBody")}{misses}</Verdict>;
  if (verdict === "unknown") return <Verdict tone="warn" title={t.rich("level.verdict.unknown", values)}>{t("level.verdict.unknownBody")}{misses}</Verdict>;
  return <Verdict tone={closes === false ? "warn" : "plain"} title={t.rich("level.verdict.spread", values)}>{t("level.verdict.spreadBody")}{misses}</Verdict>;
}

/** Shims at every reading, the pairs that count, the checks, and the falls. */
export function LevelResults({ answer }: { answer: LevelAnswer }) {
  const t = useTranslate();
  return (
    <>
      <ShimTable answer={answer} />
      <PairList answer={answer} />
      <Note title={t("level.shimming.title")}>{t("level.shimming.body")}</Note>
      <section aria-labelledby="checks-title">
        <h2 id="checks-title">{t("level.checks.title")}</h2>
        <KeyValues
          items={[
            { label: t("level.checks.backsights"), value: <LengthText text={answer.arithmeticCheck.backsights.text} /> },
            { label: t("level.checks.foresights"), value: <LengthText text={answer.arithmeticCheck.foresights.text} /> },
            { label: t("level.checks.difference"), value: <LengthText text={answer.arithmeticCheck.difference.text} /> },
            ...(answer.misclosure === null ? [] : [{ label: t("level.checks.misclosure"), value: <LengthText text={answer.misclosure.text} /> }, { label: t("level.checks.allowed"), value: <LengthText text={answer.closingTolerance.text} /> }]),
          ]}
        />
        <p>{t("level.checks.proves")}</p>
        {answer.misclosure === null ? <p>{t("level.checks.notClosed")}</p> : null}
      </section>
      {answer.falls.length === 0 ? null : (
        <Disclosure summary={t("level.falls.title")}>
          <FallTable answer={answer} />
        </Disclosure>
      )}
    </>
  );
}

/** `ab 12' 4"`, or the reading's own number where it has no wall. */
function usePlaceName(answer: LevelAnswer) {
  const t = useTranslate();
  return (index: number) => {
    const { wall, station } = answer.points[index]!;
    if (wall === null) return t("level.table.reading", { number: index + 1 });
    return station === null ? wall.toUpperCase() : `${wall.toUpperCase()} ${station.text}`;
  };
}

function ShimTable({ answer }: { answer: LevelAnswer }) {
  const t = useTranslate();
  return (
    <section aria-labelledby="shims-title">
      <h2 id="shims-title">{t("level.table.title")}</h2>
      <p>{t("level.table.intro")}</p>
      <div className="overflow-x-auto">
        <table className="data-table">
          <thead>
            <tr>
              <th scope="col">{t("level.table.number")}</th>
              <th scope="col">{t("level.table.place")}</th>
              <th scope="col" className="figure">{t("level.table.elevation")}</th>
              <th scope="col" className="figure">{t("level.table.shim")}</th>
            </tr>
          </thead>
          <tbody>
            {answer.points.map(({ index, wall, station, elevation, shim }) => (
              <tr key={index}>
                <th scope="row">{index + 1}</th>
                <td>
                  {wall === null ? t("level.table.noPlace") : wall.toUpperCase()} {station === null ? null : <LengthText text={station.text} />}
                </td>
                <td className="figure">
                  <LengthText text={elevation.text} />
                </td>
                <td className="figure">
                  {index === answer.high.index ? t("level.table.high") : <LengthText text={shim.text} />}
                  {index === answer.low.index && answer.spread.in > 0 ? ` ${t("level.table.low")}` : null}
                </td>
              </tr>
            ))}
          </tbody>
        </table>
      </div>
    </section>
  );
}

function PairList({ answer }: { answer: LevelAnswer }) {
  const t = useTranslate();
  const placeName = usePlaceName(answer);
  const told = answer.pairs.filter(({ ok }) => ok !== true);
  const nearest = answer.pairs[0];
  if (answer.tolerance === null || nearest === undefined) return null;
  return (
    <section aria-labelledby="pairs-title">
      <h2 id="pairs-title">{t("level.pairs.title")}</h2>
      <ul className="findings">
        {(told.length === 0 ? [nearest] : told).map((pair) => {
          const values = { a: placeName(pair.a), b: placeName(pair.b), difference: <LengthText text={pair.difference.text} />, limit: <LengthText text={pair.limit.text} />, distance: pair.distance === null ? "" : <LengthText text={pair.distance.text} />, within: pair.within === null ? "" : <LengthText text={pair.within.text} /> };
          const key = pair.ok === null ? "unplaced" : pair.distance === null ? "anywhere" : "apart";
          return (
            <li key={`${pair.a}-${pair.b}`} data-tone={pair.ok === false ? "out" : pair.ok === null ? "warn" : "good"}>
              <p>{t.rich(`level.pairs.${key}`, values)}</p>
              <p className="findings-note">{pair.within === null ? t.rich("level.pairs.limitAnywhere", values) : t.rich("level.pairs.limit", values)}</p>
            </li>
          );
        })}
      </ul>
      {answer.pairsOut > told.length ? <p>{t("level.pairs.more", { count: answer.pairsOut - told.filter(({ ok }) => ok === false).length })}</p> : null}
    </section>
  );
}

function FallTable({ answer }: { answer: LevelAnswer }) {
  const t = useTranslate();
  const placeName = usePlaceName(answer);
  return (
    <div className="overflow-x-auto">
      <table className="data-table">
        <thead>
          <tr>
            <th scope="col">{t("level.falls.from")}</th>
            <th scope="col">{t("level.falls.to")}</th>
            <th scope="col" className="figure">{t("level.falls.fall")}</th>
            <th scope="col" className="figure">{t("level.falls.oneIn")}</th>
          </tr>
        </thead>
        <tbody>
          {answer.falls.map(({ from, to, fall, oneIn }) => (
            <tr key={`${from}-${to}`}>
              <td>{placeName(from)}</td>
              <td>{placeName(to)}</td>
              <td className="figure">
                <LengthText text={fall.text} />
              </td>
              <td className="figure">{oneIn === null ? t("level.falls.none") : t("level.falls.oneInValue", { run: Math.round(oneIn) })}</td>
            </tr>
          ))}
        </tbody>
      </table>
    </div>
  );
}
