import { calculators } from "../../calculators";
import { queryFromInput } from "../../calculators/schema";

/** The first worked example of every operation: what the API is sent, and the address of the page that shows it. */
const examples = calculators.flatMap(({ name, operations }) =>
  operations.flatMap(({ path, examples: [example] }) => {
    if (example === undefined) return [];
    const mode = operations.length > 1 ? { mode: path.split("/").at(-1) } : {};
    return [{ calculator: name, path, input: example.input, page: `/calculators/${name}?${queryFromInput({ ...mode, ...example.input }).toString()}` }];
  }),
);

console.log(JSON.stringify(examples));
