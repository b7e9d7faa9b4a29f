import "server-only";
import { QueryTypes } from "sequelize";
import { Problem } from "@/lib/http/problem";
import { database } from "@/lib/database";
import { limiterOf } from "@/lib/services/limiter";

const patience = 1_000;

let asking: Promise<boolean> | undefined;

/** Whether MariaDB answers within a second. Askers share one question, so that a database that hangs is not asked ever more. */
function databaseAnswers(): Promise<boolean> {
  return (asking ??= ask().finally(() => {
    asking = undefined;
  }));
}

async function ask(): Promise<boolean> {
  let timer: NodeJS.Timeout | undefined;
  const tooLate = new Promise<boolean>((resolve) => {
    timer = setTimeout(resolve, patience, false);
  });
  const answered = database()
    .query("SELECT 1", { type: QueryTypes.SELECT })
    .then(() => true, () => false);
  return Promise.race([answered, tooLate]).finally(() => clearTimeout(timer));
}

/** @throws Problem not-ready while the database is away. Calculations answer all the same, and so does the limiter. */
export async function readiness(): Promise<{ ready: true; database: "up"; limiter: "up" | "reduced" }> {
  if (!(await databaseAnswers())) throw new Problem("not-ready", { headers: { "Retry-After": "10" } });
  return { ready: true, database: "up", limiter: limiterOf("calculation")?.reduced ? "reduced" : "up" };
}
