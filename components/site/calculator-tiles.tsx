import { calculators } from "@/calculators";
import { TileDrawing } from "@/components/drawing/tile-drawings";
import { localePath } from "@/lib/client/i18n/locales";
import type { Translate } from "@/lib/client/i18n/translate";

/** Every calculator that has a page, in the order of the work. Needs `common` and `home`. */
export function CalculatorTiles({ t, heading: Heading }: { t: Translate; heading: "h2" | "h3" }) {
  return (
    <ul className="tiles">
      {calculators.map(({ name }) => (
        <li key={name} className="tile">
          <TileDrawing name={name} />
          <div>
            <Heading>
              <a href={localePath(t.locale, `/calculators/${name}`)}>{t(`common.calculators.${name}`)}</a>
            </Heading>
            <p>{t(`home.tiles.${name}`)}</p>
          </div>
        </li>
      ))}
    </ul>
  );
}
