import { queryFromInput } from "@/calculators/schema/query";
import { localePath, type Locale } from "@/lib/client/i18n/locales";

/** The page of a calculator with its whole input in the address, for carrying a result on, worked examples and short links. */
export function calculatorAddress(locale: Locale, name: string, input: object = {}): string {
  const query = queryFromInput(input).toString();
  return localePath(locale, `/calculators/${name}${query === "" ? "" : `?${query}`}`);
}
