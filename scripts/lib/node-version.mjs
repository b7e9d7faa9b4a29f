// Written in the plainest JavaScript, without imports: an old Node must get as far as saying that it is old.

export const LEAST_NODE = "20.9";

/** The sentence to show when this Node is too old for Next 16, or an empty text. */
export function nodeTooOld(version) {
  const have = version.split(".").map(Number);
  const least = LEAST_NODE.split(".").map(Number);
  if (have[0] > least[0] || (have[0] === least[0] && have[1] >= least[1])) return "";
  return "This is Node " + version + ", and Sillwright needs Node " + LEAST_NODE + " or newer: install it (nodejs.org or nvm; .nvmrc names the version) and start again.";
}

/** Runs a task of `scripts/tasks/` unless this Node is too old for it. */
export function task(name) {
  const sentence = nodeTooOld(process.versions.node);
  if (sentence) {
    console.error(sentence);
    process.exit(1);
  }
  import("../tasks/" + name + ".mjs").catch(function (error) {
    console.error(error);
    process.exit(1);
  });
}
