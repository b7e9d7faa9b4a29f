import { webManifest } from "@/components/site/web-manifest";

export const dynamic = "force-static";

export const GET = () => webManifest("en");
