/** The examples of the API's page, in the one place where they are written. A test runs each as it stands against the running site. */
export interface CodeExample {
  id: "first" | "typescript" | "batch";
  language: "sh" | "ts";
  code: string;
}

export function codeExamples(site: string): CodeExample[] {
  return [
    {
      id: "first",
      language: "sh",
      code: `curl ${site}/api/v1/squareness \\
  -H 'Content-Type: application/json' \\
  -d '{
    "length": "28 ft", "width": "24 ft",
    "diagonals": { "ac": "444 5/16", "bd": "442 13/16" },
    "burn": "1 in", "tolerance": "1/4 in"
  }'`,
    },
    {
      id: "typescript",
      language: "ts",
      code: `async function calculate(operation: string, input: object) {
  const response = await fetch(\`${site}/api/v1/\${operation}\`, {
    method: "POST",
    headers: { "Content-Type": "application/json", "Accept-Language": "en" },
    body: JSON.stringify(input),
  });
  if (response.ok) return response.json();
  if (response.status === 429) {
    const seconds = Number(response.headers.get("Retry-After"));
    await new Promise((passed) => setTimeout(passed, seconds * 1000));
    return calculate(operation, input);
  }
  const problem = await response.json();
  const faults = problem.errors ?? [{ pointer: "", detail: problem.detail }];
  throw new Error(faults.map((fault: { pointer: string; detail: string }) => \`\${fault.pointer} \${fault.detail}\`).join("\\n"));
}

const { lines, reading } = await calculate("insets", {
  length: "28 ft", width: "24 ft", inset: "7/16", burn: "1",
});
console.log(\`Snap AB at \${lines.ab.text}; the diagonals must read \${reading.text}.\`);`,
    },
    {
      id: "batch",
      language: "sh",
      code: `curl ${site}/api/v1/batch \\
  -H 'Content-Type: application/json' \\
  -d '{ "items": [
    { "operation": "corners", "input": { "legs": ["28 ft", "22 ft"] } },
    { "operation": "conversions", "input": { "value": "8.7249 m" } }
  ] }'`,
    },
  ];
}
