import nextCoreWebVitals from "eslint-config-next/core-web-vitals";
import nextTypescript from "eslint-config-next/typescript";

/** Imports go only down this list: a folder may import those named, and no other of ours. */
const mayImport = {
  calculators: [],
  "api-spec": ["calculators"],
  models: [],
  "lib/client": ["calculators", "api-spec"],
  lib: ["calculators", "api-spec", "models"],
  components: ["calculators", "api-spec", "lib/client"],
};

const folders = ["calculators", "api-spec", "models", "lib", "components", "app", "tests"];

function importRule([folder, allowed]) {
  const banned = folders.filter((other) => other !== folder.split("/")[0] && !allowed.some((name) => name.split("/")[0] === other));
  const patterns = banned.map((other) => ({ group: [`@/${other}`, `@/${other}/*`], message: `${folder}/ does not import ${other}/; see the folder table in README.md.` }));
  if (allowed.includes("lib/client")) patterns.push({ regex: "^@/lib/(?!client/)", message: `${folder}/ imports lib/client alone of lib/.` });
  if (folder === "lib/client") patterns.push({ regex: "^@/lib/(?!client/)", message: "lib/client is read by browsers and imports nothing else of lib/." });
  return {
    files: [`${folder}/**/*.{ts,tsx}`],
    rules: { "no-restricted-imports": ["error", { patterns }] },
  };
}

const config = [
  { ignores: ["node_modules/**", ".next/**", ".next-*/**", ".data/**", "next-env.d.ts", "public/**", "api-spec/openapi.json"] },
  ...nextCoreWebVitals,
  ...nextTypescript,
  {
    rules: {
      "@typescript-eslint/no-unused-vars": ["error", { argsIgnorePattern: "^_", varsIgnorePattern: "^_" }],
      "@typescript-eslint/consistent-type-imports": ["error", { fixStyle: "inline-type-imports" }],
      "no-console": ["error", { allow: ["warn", "error"] }],
      eqeqeq: "error",
    },
  },
  { files: ["scripts/**", "tests/**", "*.config.*"], rules: { "no-console": "off" } },
  { files: ["migrations/**", "**/*.cjs", ".sequelizerc"], rules: { "@typescript-eslint/no-require-imports": "off" } },
  ...Object.entries(mayImport).map(importRule),
];

export default config;
