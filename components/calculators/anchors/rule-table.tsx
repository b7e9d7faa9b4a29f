"use client";

import type { RuleText } from "@/calculators/rules";
import { useTranslate } from "@/lib/client/i18n/messages-context";
import type { Translate } from "@/lib/client/i18n/translate";
import { statusText } from "./status-text";

const figures = ["diameter", "spacing", "spacingOfThicker", "endMinimum", "endMaximum", "foundationEndMaximum", "boltsPerPiece", "middleThird", "embedment", "edgeCover", "washer"] as const;
/** Told only where the rule states them. */
const uncommon: readonly string[] = ["spacingOfThicker", "foundationEndMaximum"];

/** Every figure of a rule with its clause and how far the source was read; what it does not state is said so. */
export function RuleTable({ rule }: { rule: RuleText }) {
  const t = useTranslate();
  const rows = figures.flatMap((name) => {
    const value = valueOf(rule, name, t);
    return value === null && uncommon.includes(name) ? [] : [{ name, value, figure: rule[name] }];
  });
  return (
    <dl className="rule-figures">
      {rows.map(({ name, value, figure }) => (
        <div key={name}>
          <dt>{t(`anchors.figure.${name}`)}</dt>
          <dd>
            {value === null ? <span className="rule-silent">{t("anchors.rule.notStated")}</span> : <b className="num">{value}</b>}
            {value === null ? null : <span className="findings-note">{[figure.clause, statusText(figure.status, t)].filter(Boolean).join(", ")}</span>}
          </dd>
        </div>
      ))}
      {rule.shortWalls.map((wall) => (
        <div key={wall.upTo}>
          <dt>{t("anchors.figure.shortWall", { upTo: unitText(wall.upTo, t) })}</dt>
          <dd>
            <b className="num">{t("anchors.figure.shortWallBolts", { count: wall.bolts })}</b>
            <span className="findings-note">{[wall.clause, statusText(wall.status, t)].filter(Boolean).join(", ")}</span>
          </dd>
        </div>
      ))}
    </dl>
  );
}

function valueOf(rule: RuleText, name: (typeof figures)[number], t: Translate): string | null {
  switch (name) {
    case "boltsPerPiece":
      return rule.boltsPerPiece.value === null ? null : String(rule.boltsPerPiece.value);
    case "middleThird":
      return rule.middleThird.value === null ? null : t(rule.middleThird.value ? "anchors.rule.yes" : "anchors.rule.no");
    case "endMinimum": {
      const { value, diameters } = rule.endMinimum;
      return diameters === null ? unitText(value, t) : t("anchors.figure.diameters", { count: diameters });
    }
    case "spacingOfThicker": {
      const { diameter, value } = rule.spacingOfThicker;
      return diameter === null || value === null ? null : t("anchors.figure.thicker", { diameter: unitText(diameter, t) ?? "", value: unitText(value, t) ?? "" });
    }
    case "washer": {
      const { size, thickness } = rule.washer;
      return size === null ? null : t("anchors.figure.washerSize", { size: unitText(size, t) ?? "", thickness: unitText(thickness, t) ?? "" });
    }
    default:
      return unitText(rule[name].value, t);
  }
}

/** A figure as its source prints it, the unit in the reader's language. */
function unitText(text: string, t: Translate): string;
function unitText(text: string | null, t: Translate): string | null;
function unitText(text: string | null, t: Translate): string | null {
  return text === null ? null : text.replace(/ (ft|in|mm|m)$/, (_, unit: string) => ` ${t(`anchors.unit.${unit}`)}`);
}
