import type { MetadataRoute } from "next";
import { env } from "@/lib/env";

export const dynamic = "force-static";

/** Short links are private to whoever has them; answers without script repeat the calculators' pages. */
export default function robots(): MetadataRoute.Robots {
  return {
    rules: { userAgent: "*", allow: "/", disallow: ["/api/", "/c/", "/es/c/", "/calculators/*/answer", "/es/calculators/*/answer"] },
    sitemap: new URL("/sitemap.xml", env.SITE_URL).href,
  };
}
