import type { Options } from "sequelize";

declare const connection: Options;
export = connection;
