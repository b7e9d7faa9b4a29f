import { createHash } from "node:crypto";
import { existsSync, readdirSync, readFileSync, writeFileSync } from "node:fs";
import path from "node:path";

/** Every script written into a page's HTML, as the browser will hash it. */
export function inlineScripts(html) {
  const scripts = [];
  for (const [, attributes, text] of html.matchAll(/<script\b([^>]*)>([\s\S]*?)<\/script>/gi)) {
    const dataOnly = /\btype\s*=\s*["']?(application\/(ld\+)?json|text\/plain)/i.test(attributes); // data, which no browser runs
    if (!/\bsrc\s*=/i.test(attributes) && !dataOnly && text !== "") scripts.push(text);
  }
  return scripts;
}

const hashOf = (script) => `'sha256-${createHash("sha256").update(script, "utf8").digest("base64")}'`;

/** Pages that need more than the rest, by their address without the language. The API reference writes styles while it runs. */
const looser = { "/developers": { "style-src": ["'self'", "'unsafe-inline'"], "img-src": ["'self'", "data:"] } };

/**
 * The policy of one prerendered page: its own inline scripts by their hashes and nothing else inline. Next's documented way by
 * integrity attributes blocks those scripts and with them every control on the page.
 */
export function policyFor(html, address) {
  const hashes = [...new Set(inlineScripts(html).map(hashOf))].sort();
  const directives = {
    "default-src": ["'none'"],
    "script-src": ["'self'", ...hashes],
    "style-src": ["'self'"],
    "img-src": ["'self'", "data:"],
    "font-src": ["'self'"],
    "connect-src": ["'self'"],
    "manifest-src": ["'self'"],
    "worker-src": ["'self'"],
    "form-action": ["'self'"],
    "base-uri": ["'none'"],
    "frame-ancestors": ["'none'"],
    "object-src": ["'none'"],
    ...looser[address.replace(/^\/(en|es)(?=\/|$)/, "") || "/"],
  };
  return Object.entries(directives).map(([name, values]) => `${name} ${values.join(" ")}`).join("; ");
}

function htmlFiles(folder) {
  if (!existsSync(folder)) return [];
  return readdirSync(folder, { recursive: true, encoding: "utf8" }).filter((file) => file.endsWith(".html")).sort();
}

/**
 * Writes each prerendered page's policy into the `.meta` file beside it, whose headers Next's server sends with the page, in
 * every build folder given, and the status of the page for addresses that have none. Answers how many pages there are.
 */
export function writeSecurityHeaders(buildFolders) {
  let pages = 0;
  for (const [index, folder] of buildFolders.entries()) {
    const app = path.join(folder, "server", "app");
    for (const file of htmlFiles(app)) {
      const address = `/${file.replace(/\.html$/, "").replace(/^index$/, "")}`;
      const policy = policyFor(readFileSync(path.join(app, file), "utf8"), address);
      const metaFile = path.join(app, file.replace(/\.html$/, ".meta"));
      const meta = existsSync(metaFile) ? JSON.parse(readFileSync(metaFile, "utf8")) : {};
      // A page that called notFound() would be prerendered empty and drawn by script; this one is written out, and only its status is said here.
      if (path.basename(file) === "missing.html") meta.status = 404;
      meta.headers = { ...meta.headers, "content-security-policy": policy };
      writeFileSync(metaFile, JSON.stringify(meta));
      if (index === 0) pages += 1;
    }
  }
  return pages;
}
