import path from "node:path";
import { mustRun } from "./run.mjs";
import { root } from "./settings.mjs";

/** Puts the demo short links into a local database that does not have them. */
export async function seedDemo(url) {
  const { default: mariadb } = await import("mariadb");
  const connection = await mariadb.createConnection(url);
  try {
    const [{ found }] = await connection.query("SELECT COUNT(*) AS found FROM short_links WHERE id LIKE 'demo%'");
    if (Number(found) > 0) return "already here";
  } finally {
    await connection.end();
  }
  // The links' answers come from the calculators themselves, which are TypeScript; react-server is the condition `server-only` asks for.
  const output = await mustRun("The demo data could not be written: the lines above say why.", process.execPath, ["--conditions=react-server", "--import", "tsx", path.join(root, "scripts", "seed-demo.ts")], {
    cwd: root,
    env: { ...process.env, DATABASE_URL: url, UPSTASH_REDIS_REST_URL: "http://127.0.0.1:1", UPSTASH_REDIS_REST_TOKEN: "unused" },
  });
  return output.trim();
}
