import { fileURLToPath } from "node:url";

/**
 * English has no prefix in its addresses, Spanish has /es: `/calculators/corner` is served by `app/[locale]` as
 * `/en/calculators/corner`. Content-Security-Policy is not here: static pages get theirs after the build (per-page
 * hashes, scripts/lib/csp.mjs), dynamic pages from proxy.ts.
 */

// Named, since Next otherwise takes the topmost folder with a lock file for the root and nests the standalone site under it.
const root = fileURLToPath(new URL(".", import.meta.url));

const reserved = "api|_next|en|es|fonts|icons";

/** @type {import("next").NextConfig} */
const config = {
  output: "standalone",
  outputFileTracingRoot: root,
  turbopack: { root },
  typescript: { ignoreBuildErrors: true }, // `npm run check` is where types are checked; a slip in a test must not keep the site from starting
  distDir: process.env.NEXT_DIST_DIR ?? ".next",
  poweredByHeader: false,
  reactStrictMode: true,
  serverExternalPackages: ["sequelize", "mariadb", "pino"],
  async rewrites() {
    return {
      beforeFiles: [],
      afterFiles: [
        { source: "/", destination: "/en" },
        { source: `/:path((?!(?:${reserved})(?:/|$))[^.]*)`, destination: "/en/:path" },
      ],
      // What no page answers: the prerendered page that says so, in the address's language and with status 404.
      fallback: [
        { source: "/es/:path*", destination: "/es/missing" },
        { source: "/:path((?!(?:api|_next)(?:/|$)).*)", destination: "/en/missing" },
      ],
    };
  },
  async redirects() {
    return [
      { source: "/en", destination: "/", permanent: true },
      { source: "/en/:path*", destination: "/:path*", permanent: true },
    ];
  },
  async headers() {
    return [
      {
        source: "/:path*",
        headers: [
          { key: "X-Content-Type-Options", value: "nosniff" },
          { key: "X-Frame-Options", value: "DENY" },
          { key: "Referrer-Policy", value: "strict-origin-when-cross-origin" },
          { key: "Permissions-Policy", value: "camera=(), microphone=(), geolocation=(), payment=()" },
          { key: "Cross-Origin-Opener-Policy", value: "same-origin" },
        ],
      },
      // Whoever has the address of a kept calculation can read it.
      ...["/c/:id", "/es/c/:id"].map((source) => ({
        source,
        headers: [
          { key: "Referrer-Policy", value: "no-referrer" },
          { key: "X-Robots-Tag", value: "noindex, nofollow" },
        ],
      })),
      // A stale worker would keep a phone on an old edition of the site.
      { source: "/sw.js", headers: [{ key: "Cache-Control", value: "no-cache" }] },
    ];
  },
};

export default config;
