import { notFound } from "next/navigation";

/** What `next.config.mjs` serves for every address that is no page: prerendered, in the reader's language, with status 404. */
export default function MissingPage() {
  notFound();
}
