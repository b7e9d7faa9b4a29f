/** A stop that has a known reason: its message is the one sentence that says what to do, and is shown without a stack. */
export class Failure extends Error {
  /** @param {string} sentence @param {{ details?: string }} [more] output of the tool that failed, shown above the sentence */
  constructor(sentence, { details } = {}) {
    super(sentence);
    this.details = details;
  }
}

/** The sentence for a full disk, or undefined when the error is about something else. */
export function diskFull(error, folder) {
  const text = `${error?.code ?? ""} ${error?.message ?? error ?? ""} ${error?.details ?? ""}`;
  if (!/ENOSPC|No space left|\b(errno|errcode|error|error code):? 28\b/i.test(text)) return undefined;
  return new Failure(`The disk that holds ${folder} is full: free at least 2 GB there and start again.`);
}
