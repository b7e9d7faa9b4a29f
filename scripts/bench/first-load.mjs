import { gzipSync } from "node:zlib";
import { openBrowser, pagesOf, phone, untilAnswered } from "./browser.mjs";
import { atMost } from "./table.mjs";

const scriptInPage = /<(?:script[^>]+src|link[^>]+as="script"[^>]+href)="([^"]+\.js[^"]*)"/g;

/** Scripts the page itself names, save the one for browsers that know no modules. */
function scriptsOf(html) {
  const modern = html.replace(/<script[^>]+nomodule[^>]*>/gi, "");
  return new Set([...modern.matchAll(scriptInPage)].map(([, source]) => source.replaceAll("&amp;", "&")));
}

/** kB of JavaScript under gzip -9: what the page names, which runs before the first input; and all that came until the answer stood. */
export async function firstLoad(site, examples) {
  const browser = await openBrowser();
  try {
    const rows = [];
    for (const { calculator, page: address } of pagesOf(examples)) {
      const context = await browser.newContext(phone);
      const page = await context.newPage();
      const sizes = new Map();
      const reading = [];
      page.on("response", (response) => {
        const { pathname, search } = new URL(response.url());
        if (!pathname.endsWith(".js")) return;
        reading.push(response.body().then((body) => sizes.set(pathname + search, gzipSync(body, { level: 9 }).length), () => undefined));
      });
      const html = await (await page.goto(site.address + address, { waitUntil: "networkidle" })).text();
      await untilAnswered(page);
      await page.waitForLoadState("networkidle");
      await Promise.all(reading);
      const kilobytes = (names) => [...names].reduce((sum, name) => sum + (sizes.get(name) ?? 0), 0) / 1000;
      rows.push(atMost(`JS of ${calculator} before first input, gzip`, kilobytes(scriptsOf(html)), 165, " kB", 1));
      rows.push(atMost(`JS of ${calculator} in all, gzip`, kilobytes(sizes.keys()), 210, " kB", 1));
      await context.close();
    }
    return rows;
  } finally {
    await browser.close();
  }
}
