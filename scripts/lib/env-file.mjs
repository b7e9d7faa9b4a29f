import { readFileSync } from "node:fs";

/**
 * Takes `NAME=value` lines into the environment where it does not have them yet. Node's own loader came after 20.9.
 * @param {string} file
 * @param {Record<string, string | undefined>} environment
 */
export function loadEnvFile(file, environment = process.env) {
  let text;
  try {
    text = readFileSync(file, "utf8");
  } catch (error) {
    if (error.code === "ENOENT") return;
    throw error;
  }
  for (const line of text.split(/\r?\n/)) {
    const [, name, value] = /^\s*(?:export\s+)?([A-Za-z_]\w*)\s*=\s*(.*?)\s*$/.exec(line) ?? [];
    if (!name || environment[name] !== undefined) continue;
    const quoted = /^(["'])(.*)\1(?:\s+#.*)?$/.exec(value);
    environment[name] = quoted ? quoted[2] : value.replace(/\s+#.*$/, "");
  }
}
