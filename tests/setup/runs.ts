/** How many cases a property test tries: `usual` in a test run, many times as many under `npm run prove`. */
export function runs(usual: number): number {
  return process.env.PROVE ? usual * 25 : usual;
}
