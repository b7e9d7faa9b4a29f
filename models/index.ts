import "server-only";
import type { Sequelize } from "sequelize";
import { defineShortLink } from "./short-link";

export { ShortLink } from "./short-link";

/** Ties every model to one connection pool. */
export function defineModels(sequelize: Sequelize): void {
  defineShortLink(sequelize);
}
