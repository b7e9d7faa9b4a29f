import type { MadeLink, ProblemAnswer } from "@/api-spec";

export interface ShortLinkRequest {
  operation: string;
  input: Record<string, unknown>;
  language: string;
}

/** What the API answered instead of a link: its own sentence, and the first faulty field's where there are some. */
export class ProblemAnswered extends Error {
  override readonly name = "ProblemAnswered";
}

/** @throws ProblemAnswered, or a TypeError where there is no connection. */
export async function makeShortLink({ language, ...request }: ShortLinkRequest): Promise<MadeLink> {
  const response = await fetch("/api/v1/links", {
    method: "POST",
    headers: { "Content-Type": "application/json", "Accept-Language": language },
    body: JSON.stringify({ ...request, language }),
  });
  if (response.ok) return (await response.json()) as MadeLink;
  const problem = (await response.json().catch(() => null)) as ProblemAnswer | null;
  throw new ProblemAnswered(problem?.errors?.[0]?.detail ?? problem?.detail ?? String(response.status));
}
