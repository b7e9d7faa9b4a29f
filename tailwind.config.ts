import type { Config } from "tailwindcss";

/** Every colour is a variable of app/styles/tokens.css, so that one class serves the light, dark and sunlight themes. */
const token = (name: string) => `var(--${name})`;

const config: Config = {
  content: ["./app/**/*.{ts,tsx}", "./components/**/*.{ts,tsx}"],
  theme: {
    extend: {
      colors: {
        page: token("page"),
        sheet: token("sheet"),
        field: token("field"),
        concrete: token("concrete"),
        speckle: token("speckle"),
        rule: token("rule"),
        edge: token("edge"),
        ink: { DEFAULT: token("ink"), 2: token("ink-2") },
        "on-ink": token("on-ink"),
        chalk: { DEFAULT: token("chalk"), soft: token("chalk-soft"), line: token("chalk-line") },
        "on-chalk": token("on-chalk"),
        keel: { DEFAULT: token("keel"), soft: token("keel-soft") },
        plumb: { DEFAULT: token("plumb"), soft: token("plumb-soft") },
        amber: { DEFAULT: token("amber"), soft: token("amber-soft") },
        timber: { DEFAULT: token("timber"), edge: token("timber-edge") },
        steel: token("steel"),
        band: { DEFAULT: token("band"), ink: token("band-ink") },
        code: { DEFAULT: token("code"), ink: token("code-ink") },
      },
      fontFamily: {
        sans: ["var(--font-text)", "system-ui", "sans-serif"],
        disp: ["var(--font-heading)", "var(--font-text)", "sans-serif"],
        num: ["var(--font-figures)", "ui-monospace", "monospace"],
      },
      maxWidth: { site: "77.5rem" },
    },
  },
};

export default config;
