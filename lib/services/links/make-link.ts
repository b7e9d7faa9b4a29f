import "server-only";
import { UniqueConstraintError } from "sequelize";
import { calculatorOf, operations } from "@/calculators";
import { answerTo } from "@/calculators/schema";
import { database } from "@/lib/database";
import { Problem } from "@/lib/http/problem";
import type { Locale } from "@/lib/client/i18n/locales";
import { withDatabase } from "@/lib/services/database-away";
import { ShortLink } from "@/models";
import { shortId } from "./short-id";

/**
 * Keeps a calculation under a short address: what was asked, and what this version answered.
 *
 * @throws Problem invalid-fields when the calculator refuses the input: a link that opens to an error helps nobody.
 */
export async function makeLink({ operation: path, input, language }: { operation: string; input: Record<string, unknown>; language: Locale }): Promise<ShortLink> {
  const operation = operations.get(path);
  const calculator = calculatorOf(path);
  if (operation === undefined || calculator === undefined) throw new Problem("invalid-fields", { issues: [{ pointer: "/operation", code: "not-one-of", params: { options: [...operations.keys()].join(", ") } }] });
  const { answer, issues } = answerTo(operation, input);
  if (answer === null) throw new Problem("invalid-fields", { issues: issues.map((issue) => ({ ...issue, pointer: `/input${issue.pointer}` })) });
  const kept = { calculator: calculator.name, operation: path, version: calculator.version, locale: language, inputs: input, answer };
  return withDatabase(async () => {
    database();
    try {
      return await ShortLink.create({ ...kept, id: shortId() });
    } catch (error) {
      if (error instanceof UniqueConstraintError) return ShortLink.create({ ...kept, id: shortId() });
      throw error;
    }
  });
}
