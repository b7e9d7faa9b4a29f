import { calculatorOf, operations } from "@/calculators";
import { answerTo } from "@/calculators/schema";
import { database } from "@/lib/database";
import { ShortLink } from "@/models";

/** An invented slab, read once when it was true and once when it had racked. */
const demoLinks = [
  { id: "demoSquare", operation: "squareness", inputs: { sides: { ab: "28' 1\"", da: "22' 1\"" }, diagonals: { ac: "35' 8 5/16\"", bd: "35' 8 5/16\"" }, burn: "1", tolerance: "1/4" } },
  { id: "demoRacked", operation: "squareness", inputs: { sides: { ab: "28' 1\"", da: "22' 1\"" }, diagonals: { ac: "35' 9 1/8\"", bd: "35' 7 1/2\"" }, burn: "1", tolerance: "1/4" } },
];

/** Writes the demo links with the answers this core gives, for the calculators it has. */
async function seed(): Promise<string> {
  const sequelize = database();
  const written: string[] = [];
  for (const { id, operation: path, inputs } of demoLinks) {
    const operation = operations.get(path);
    const calculator = calculatorOf(path);
    if (!operation || !calculator) continue;
    const { answer, issues } = answerTo(operation, inputs);
    if (!answer) throw new Error(`The demo reading ${id} is not answered: ${JSON.stringify(issues)}`);
    await ShortLink.upsert({ id, calculator: calculator.name, operation: path, version: calculator.version, locale: "en", inputs, answer });
    written.push(`/c/${id}`);
  }
  await sequelize.close();
  return written.join(" and ") || "none for these calculators";
}

seed().then(console.log, (error: unknown) => {
  console.error(error);
  process.exitCode = 1;
});
