import { row } from "./table.mjs";

/** Every address of the sitemap must come prerendered: the same bytes for everybody, made at build time. */
export async function staticPages(site) {
  const sitemap = await (await fetch(`${site.address}/sitemap.xml`)).text();
  const paths = [...sitemap.matchAll(/<loc>([^<]+)<\/loc>/g)].map(([, address]) => new URL(address).pathname);
  const dynamic = [];
  for (const path of paths) {
    const response = await fetch(site.address + path);
    await response.arrayBuffer();
    if (response.status !== 200 || !/^1\b/.test(response.headers.get("x-nextjs-prerender") ?? "")) dynamic.push(`${path} (${response.status})`);
  }
  if (dynamic.length > 0) console.log(`Not static: ${dynamic.join(", ")}`);
  return [row("public pages that are static", `${paths.length - dynamic.length} of ${paths.length}`, { aim: "all", met: paths.length > 0 && dynamic.length === 0 })];
}
