import type { SillSet } from "@/lib/client/set/schema";

/** Hands the set to the browser's downloads; the writer is fetched when asked for. */
export async function saveSetFile(set: SillSet): Promise<void> {
  const { setFileName, writeSetFile } = await import("@/lib/client/set/set-file");
  const address = URL.createObjectURL(new Blob([writeSetFile(set)], { type: "application/json" }));
  const link = document.createElement("a");
  link.href = address;
  link.download = setFileName(set);
  link.click();
  setTimeout(() => URL.revokeObjectURL(address), 10_000);
}
