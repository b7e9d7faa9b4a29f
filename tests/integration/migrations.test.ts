import { execFile } from "node:child_process";
import { promisify } from "node:util";
import { type DataType, type QueryInterface, Sequelize } from "sequelize";
import { afterAll, beforeAll, describe, expect, test } from "vitest";
import { defineModels } from "@/models";
import connection from "@/models/connection.cjs";

const cli = async (command: string[], url: string) =>
  promisify(execFile)(process.execPath, ["node_modules/sequelize-cli/lib/sequelize", ...command], { env: { ...process.env, DATABASE_URL: url, NODE_ENV: "test" } });

const name = `sillwright_migrations_${process.pid}`;
const url = () => {
  const address = new URL(process.env.DATABASE_URL ?? "");
  address.pathname = `/${name}`;
  return address.href;
};

let admin: Sequelize;
let sequelize: Sequelize;
let queries: QueryInterface;

beforeAll(async () => {
  admin = new Sequelize(process.env.DATABASE_URL ?? "", connection);
  await admin.query(`CREATE DATABASE ${name} CHARACTER SET utf8mb4 COLLATE utf8mb4_unicode_ci`);
  sequelize = new Sequelize(url(), connection);
  queries = sequelize.getQueryInterface();
  defineModels(sequelize);
});

afterAll(async () => {
  await sequelize.close();
  await admin.query(`DROP DATABASE ${name}`);
  await admin.close();
});

const tables = async () => {
  const rows = (await queries.showAllTables()) as unknown as { tableName: string }[]; // objects in this dialect, whatever the types say
  return rows.map(({ tableName }) => tableName).filter((table) => table !== "SequelizeMeta");
};

describe("the migrations", () => {
  test("build every table from nothing, take all of them away again, and build them once more", async () => {
    await cli(["db:migrate"], url());
    const built = await tables();
    expect(built.length).toBeGreaterThan(0);
    await cli(["db:migrate:undo:all"], url());
    expect(await tables()).toEqual([]);
    await cli(["db:migrate"], url());
    expect(await tables()).toEqual(built);
  });

  test("make the tables that the models describe, and no other", async () => {
    expect((await tables()).sort()).toEqual(Object.values(sequelize.models).map((model) => model.getTableName()).sort());
  });

  test("make every column as its model says: name, type, null, key", async () => {
    for (const model of Object.values(sequelize.models)) {
      const table = await queries.describeTable(model.getTableName());
      const attributes = Object.values(model.getAttributes());
      expect(Object.keys(table).sort()).toEqual(attributes.map(({ field }) => field).sort());
      for (const { field = "", type, allowNull, primaryKey } of attributes) {
        const column = table[field];
        expect([field, column?.type], `${model.name}.${field}`).toEqual([field, columnType(type)]);
        expect([field, column?.allowNull, column?.primaryKey]).toEqual([field, allowNull ?? true, primaryKey ?? false]);
      }
    }
  });

  test("make the indexes that the models name", async () => {
    for (const model of Object.values(sequelize.models)) {
      const made = (await queries.showIndex(model.getTableName())) as { name: string; fields: { attribute: string }[]; primary: boolean }[];
      const wanted = (model.options.indexes ?? []).map((index) => [index.name, index.fields]);
      expect(made.filter(({ primary }) => !primary).map((index) => [index.name, index.fields.map(({ attribute }) => attribute)])).toEqual(wanted);
    }
  });

  test("keep every table in utf8mb4", async () => {
    const [rows] = await sequelize.query("SELECT table_name AS name, table_collation AS collation FROM information_schema.tables WHERE table_schema = DATABASE() AND table_name <> 'SequelizeMeta'");
    for (const row of rows as { name: string; collation: string }[]) expect(row.collation).toBe("utf8mb4_unicode_ci");
  });
});

/** The column MariaDB makes for a type: JSON is its LONGTEXT with a check, and a binary collation is not part of the type. */
function columnType(type: DataType): string {
  const text = (type as { toSql(): string }).toSql();
  return text === "JSON" ? "LONGTEXT" : text.replace(/ BINARY$/, "");
}
