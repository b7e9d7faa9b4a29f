import "server-only";

export const storePatience = 200;
const looks = 4;

/**
 * What `promise` gives, or an error when it takes longer than `patience` milliseconds of this process's own time: while a heavy
 * calculation holds the process up, an answer may lie there unread, and one clock would call the store dead.
 */
export function inTime<Answer>(promise: Promise<Answer>, patience = storePatience): Promise<Answer> {
  return new Promise((resolve, reject) => {
    let left = looks;
    const look = () => {
      left -= 1;
      if (left > 0) timer = setTimeout(look, patience / looks);
      else reject(new Error("no answer in time"));
    };
    let timer = setTimeout(look, patience / looks);
    const done = <Value>(settle: (value: Value) => void) => (value: Value) => {
      clearTimeout(timer);
      settle(value);
    };
    promise.then(done(resolve), done(reject));
  });
}
