import enAnchors from "../messages/en/anchors.json";
import enCautions from "../messages/en/cautions.json";
import enCommon from "../messages/en/common.json";
import enConversions from "../messages/en/conversions.json";
import enCorner from "../messages/en/corner.json";
import enDevelopers from "../messages/en/developers.json";
import enErrors from "../messages/en/errors.json";
import enFailure from "../messages/en/failure.json";
import enFootprint from "../messages/en/footprint.json";
import enFit from "../messages/en/fit.json";
import enHome from "../messages/en/home.json";
import enInset from "../messages/en/inset.json";
import enLegal from "../messages/en/legal.json";
import enLinks from "../messages/en/links.json";
import enSet from "../messages/en/set.json";
import enSheet from "../messages/en/sheet.json";
import enLevel from "../messages/en/level.json";
import enPlates from "../messages/en/plates.json";
import enTakeoff from "../messages/en/takeoff.json";
import enMarks from "../messages/en/marks.json";
import enSquareness from "../messages/en/squareness.json";
import esAnchors from "../messages/es/anchors.json";
import esCautions from "../messages/es/cautions.json";
import esCommon from "../messages/es/common.json";
import esConversions from "../messages/es/conversions.json";
import esCorner from "../messages/es/corner.json";
import esDevelopers from "../messages/es/developers.json";
import esErrors from "../messages/es/errors.json";
import esFailure from "../messages/es/failure.json";
import esFootprint from "../messages/es/footprint.json";
import esFit from "../messages/es/fit.json";
import esHome from "../messages/es/home.json";
import esInset from "../messages/es/inset.json";
import esLegal from "../messages/es/legal.json";
import esLinks from "../messages/es/links.json";
import esSet from "../messages/es/set.json";
import esSheet from "../messages/es/sheet.json";
import esLevel from "../messages/es/level.json";
import esPlates from "../messages/es/plates.json";
import esTakeoff from "../messages/es/takeoff.json";
import esMarks from "../messages/es/marks.json";
import esSquareness from "../messages/es/squareness.json";
import type { Locale } from "./locales";

export const namespaces = ["common", "cautions", "errors", "failure", "home", "legal", "developers", "links", "set", "sheet", "squareness", "footprint", "fit", "corner", "inset", "anchors", "conversions", "level", "plates", "takeoff", "marks"] as const;
export type Namespace = (typeof namespaces)[number];

/** A namespace's messages as written: sentences in ICU MessageFormat under nested keys. */
export type MessageTree = { readonly [key: string]: string | MessageTree };

/** Every message file. Server only by its size: a browser is given compiled messages of the namespaces its page needs. */
export const catalogue: Readonly<Record<Locale, Readonly<Record<Namespace, MessageTree>>>> = {
  en: {
    common: enCommon,
    cautions: enCautions,
    errors: enErrors,
    failure: enFailure,
    home: enHome,
    legal: enLegal,
    developers: enDevelopers,
    links: enLinks,
    set: enSet,
    sheet: enSheet,
    squareness: enSquareness,
    fit: enFit,
    footprint: enFootprint,
    corner: enCorner,
    inset: enInset,
    anchors: enAnchors,
    conversions: enConversions,
    marks: enMarks,
    takeoff: enTakeoff,
    plates: enPlates,
    level: enLevel,
  },
  es: {
    common: esCommon,
    cautions: esCautions,
    errors: esErrors,
    failure: esFailure,
    home: esHome,
    legal: esLegal,
    developers: esDevelopers,
    links: esLinks,
    set: esSet,
    sheet: esSheet,
    squareness: esSquareness,
    fit: esFit,
    footprint: esFootprint,
    corner: esCorner,
    inset: esInset,
    anchors: esAnchors,
    conversions: esConversions,
    marks: esMarks,
    takeoff: esTakeoff,
    plates: esPlates,
    level: esLevel,
  },
};
