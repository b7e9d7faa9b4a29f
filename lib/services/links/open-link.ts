import "server-only";
import { Op } from "sequelize";
import { linkIdPattern } from "@/api-spec";
import { calculatorOf, operations } from "@/calculators";
import { answerTo, type Issue } from "@/calculators/schema";
import { database } from "@/lib/database";
import { withDatabase } from "@/lib/services/database-away";
import { ShortLink } from "@/models";
import { sameAnswer } from "./same-answer";

const day = 24 * 60 * 60 * 1000;

/** A kept calculation, and what the calculator of today makes of the same input. */
export interface OpenedLink {
  link: ShortLink;
  current: {
    version: string;
    newer: boolean;
    differs: boolean;
    /** Null when today's calculator refuses the input. */
    answer: Record<string, unknown> | null;
    issues: readonly Issue[];
  };
}

/** The link with this id, or null when there is none. That it was opened is noted, at most once a day. */
export async function openLink(id: string, now = new Date()): Promise<OpenedLink | null> {
  if (!linkIdPattern.test(id)) return null;
  const link = await withDatabase(async () => {
    database();
    const found = await ShortLink.findByPk(id);
    const dayAgo = new Date(now.getTime() - day);
    if (found !== null && found.lastOpenedAt < dayAgo) {
      await ShortLink.update({ lastOpenedAt: now }, { where: { id, lastOpenedAt: { [Op.lt]: dayAgo } } });
      found.lastOpenedAt = now;
    }
    return found;
  });
  return link === null ? null : { link, current: todaysAnswer(link) };
}

function todaysAnswer(link: ShortLink): OpenedLink["current"] {
  const operation = operations.get(link.operation);
  const calculator = calculatorOf(link.operation);
  if (operation === undefined || calculator === undefined) return { version: link.version, newer: false, differs: false, answer: link.answer as Record<string, unknown>, issues: [] };
  const { answer, issues } = answerTo(operation, link.inputs);
  const plain = answer === null ? null : (JSON.parse(JSON.stringify(answer)) as Record<string, unknown>); // as it would have been kept
  return { version: calculator.version, newer: calculator.version !== link.version, differs: !sameAnswer(link.answer, plain), answer: plain, issues };
}
