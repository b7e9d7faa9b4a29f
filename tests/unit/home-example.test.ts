import { expect, test } from "vitest";
import { operations } from "@/calculators";
import { answerTo } from "@/calculators/schema";
import { apiAnswer, apiRequest } from "@/components/site/home-example";

test("the example on the home page is what the core answers", () => {
  const [line = "", ...body] = apiRequest.split("\n");
  const operation = operations.get(line.replace("POST /api/v1/", ""))!;
  const { answer, issues } = answerTo(operation, JSON.parse(body.join("\n")));
  expect(issues).toEqual([]);
  // What is shown is a part of the whole answer; each … stands for fields left out.
  expect(answer).toMatchObject(JSON.parse(apiAnswer.replace(/,\s*…/g, "")) as object);
});
