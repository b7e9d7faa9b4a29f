import { QueryTypes } from "sequelize";
import { afterAll, beforeAll, describe, expect, test } from "vitest";
import { database } from "@/lib/database";
import { ShortLink } from "@/models";

const link = { id: "aB3dEf6hIj", calculator: "squareness", operation: "squareness", version: "1.0.0", locale: "es", inputs: { note: "baño 🧱 ñ" }, answer: { verdict: "square" } };

beforeAll(async () => {
  database();
  await ShortLink.destroy({ where: { id: [link.id, link.id.toLowerCase()] } });
});
afterAll(async () => {
  await ShortLink.destroy({ where: { id: [link.id, link.id.toLowerCase()] } });
  await database().close();
});

describe("the database", () => {
  test("keeps what was sent, letters outside Latin and milliseconds included", async () => {
    const made = await ShortLink.create(link);
    const found = await ShortLink.findByPk(link.id, { rejectOnEmpty: true });
    expect(found.get({ plain: true })).toMatchObject(link);
    expect(found.createdAt.getTime()).toBe(made.createdAt.getTime());
    expect(found.lastOpenedAt.getTime()).toBe(made.lastOpenedAt.getTime());
  });

  test("tells ids apart by the case of their letters", async () => {
    await ShortLink.create({ ...link, id: link.id.toLowerCase() });
    expect(await ShortLink.count({ where: { id: [link.id, link.id.toLowerCase()] } })).toBe(2);
    expect(await ShortLink.findByPk(link.id.toUpperCase())).toBeNull();
  });

  test("answers raw queries, which the driver alone breaks under Sequelize 6", async () => {
    expect(await database().query("SELECT 1 AS one")).toEqual([[{ one: 1 }], expect.anything()]);
    const [shown] = await database().query("SHOW TABLES LIKE 'short_links'");
    expect(shown.map((row) => Object.values(row as object))).toEqual([["short_links"]]);
  });

  test("gives up waiting for a locked row after five seconds and drops idle connections before the server does", async () => {
    const [row] = await database().query<{ lockWait: number; idle: number; zone: string; charset: string }>(
      "SELECT @@innodb_lock_wait_timeout AS lockWait, @@wait_timeout AS idle, @@time_zone AS zone, @@character_set_client AS charset",
      { type: QueryTypes.SELECT },
    );
    expect(row).toEqual({ lockWait: 5, idle: 600, zone: "+00:00", charset: "utf8mb4" });
    const { options } = database() as unknown as { options: { pool: { idle: number } } }; // there, though its types leave it out
    expect(options.pool.idle / 1000).toBeLessThan(600);
  });

  test("writes each commit to disk before it answers", async () => {
    const [row] = await database().query<{ flush: number }>("SELECT @@innodb_flush_log_at_trx_commit AS flush", { type: QueryTypes.SELECT });
    expect(Number(row?.flush)).toBe(1);
  });

  test("says the same settings to every new connection, however many there were", async () => {
    const waits = await Promise.all(Array.from({ length: 8 }, () => database().query<{ wait: number }>("SELECT @@wait_timeout AS wait, SLEEP(0.05)", { type: QueryTypes.SELECT })));
    expect(new Set(waits.map(([row]) => row?.wait))).toEqual(new Set([600]));
  });
});
