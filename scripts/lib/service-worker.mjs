import { readFileSync } from "node:fs";
import path from "node:path";
import { gzipSync } from "node:zlib";
import { getManifest } from "@serwist/build";
import { build as bundle } from "esbuild";

/** Pages that are no use without signal, and files that are no page. */
const leftOut = /^\/(?:es\/)?(?:developers|missing)$|^\/(?:_not-found|_global-error|404|500|robots\.txt|sitemap\.xml|favicon\.ico)$|^\/(?:es\/)?api(?:\/|$)/;

/** The public address of a prerendered file of `.next/server/app`, or null when it is none to keep. */
export function addressOfPage(file) {
  const match = /^server\/app\/(.+)\.(html|body)$/.exec(file);
  if (match === null) return null;
  const inner = `/${match[1]}`.replace(/^\/en(?=\/|$)/, "").replace(/^\/index$/, "") || "/";
  return leftOut.test(inner) ? null : inner;
}

/** Every built file that a text names: scripts, styles, fonts, whether by path or as Turbopack writes them. */
export function filesNamedIn(text) {
  return new Set([...text.matchAll(/static\/(?:chunks|css|media)\/[\w.~@%()[\]-]+?\.(?:js|css|woff2)/g)].map(([name]) => name));
}

/** Styles name their fonts beside themselves: `../media/x.woff2`. */
function filesOf(file, text) {
  const named = filesNamedIn(text);
  if (file.endsWith(".css")) for (const [, name] of text.matchAll(/url\(["']?\.\.\/media\/([\w.~-]+\.woff2)["']?\)/g)) named.add(`static/media/${name}`);
  return named;
}

/** All files that the pages need, straight or through scripts that fetch others later. */
export function filesNeededBy(pages, read) {
  const needed = new Set();
  const queue = pages.map((page) => [page, read(page)]);
  while (queue.length > 0) {
    const [file, text] = queue.pop();
    for (const name of filesOf(file, text)) {
      if (needed.has(name)) continue;
      needed.add(name);
      if (/\.(?:js|css)$/.test(name)) {
        try {
          queue.push([name, read(name)]);
        } catch (error) {
          if (error.code !== "ENOENT") throw error;
          needed.delete(name); // a name in a text that is no file of the build
        }
      }
    }
  }
  return needed;
}

/**
 * Writes `sw.js` into the standalone site: serwist's worker with the list of every public page in both languages, the texts it
 * fetches and each script, style and font that they need, at any depth. Pages are kept whole and the site has no soft
 * navigation, so no RSC files are among them. Answers how many files and bytes a first visit fetches in the background.
 */
export async function writeServiceWorker(root, nextFolder, publicFolder) {
  const read = (file) => readFileSync(path.join(nextFolder, file), "utf8");
  const { manifestEntries } = await getManifest({
    globDirectory: nextFolder,
    globPatterns: ["static/**/*.{js,css,woff2}", "server/app/**/*.{html,body}"],
    maximumFileSizeToCacheInBytes: 4_000_000,
    dontCacheBustURLsMatching: /^static\/(?:chunks|media|css)\//, // their names are hashes
    manifestTransforms: [
      (entries) => {
        const pages = entries.filter(({ url }) => addressOfPage(url) !== null);
        const needed = filesNeededBy(pages.map(({ url }) => url), read);
        const kept = entries.flatMap((entry) => {
          const address = addressOfPage(entry.url);
          if (address !== null) return [{ ...entry, url: address }];
          return needed.has(entry.url) ? [{ ...entry, url: `/_next/${entry.url}`, revision: null }] : [];
        });
        return { manifest: kept, warnings: [] };
      },
    ],
  });
  const icons = await getManifest({ globDirectory: publicFolder, globPatterns: ["icons/*.{svg,png}", "fonts/*.ttf"], manifestTransforms: [(entries) => ({ manifest: entries.map((entry) => ({ ...entry, url: `/${entry.url}` })), warnings: [] })] });
  const entries = [...manifestEntries, ...icons.manifestEntries].map(({ url, revision }) => ({ url, revision })).sort((a, b) => (a.url < b.url ? -1 : 1));
  await bundle({
    entryPoints: [path.join(root, "lib", "client", "offline", "service-worker.ts")],
    outfile: path.join(publicFolder, "sw.js"),
    bundle: true,
    minify: true,
    format: "iife",
    target: "es2020",
    define: { precacheEntries: JSON.stringify(entries), "process.env.NODE_ENV": '"production"' },
    logLevel: "silent",
    tsconfigRaw: {},
  });
  const size = entries.reduce((sum, { url }) => sum + gzipSync(bytesOf(nextFolder, publicFolder, url)).length, 0);
  return { files: entries.length, kilobytes: Math.round(size / 1000) };
}

function bytesOf(nextFolder, publicFolder, url) {
  if (url.startsWith("/_next/")) return readFileSync(path.join(nextFolder, url.slice("/_next/".length)));
  if (/^\/(?:icons|fonts)\//.test(url)) return readFileSync(path.join(publicFolder, url));
  const inner = url === "/" ? "/en" : /^\/(?:es(?:\/|$)|manifest)/.test(url) ? url : `/en${url}`;
  for (const ending of [".html", ".body"]) {
    try {
      return readFileSync(path.join(nextFolder, "server", "app", `${inner}${ending}`));
    } catch (error) {
      if (error.code !== "ENOENT") throw error;
    }
  }
  return Buffer.alloc(0);
}
