import "server-only";

const firstPause = 1_000;
const longestPause = 10_000;
const quietFor = 60_000;

/**
 * Whether the store is away. One failure is enough: nobody after it waits for the store. Once the pause is over the next
 * caller sets off a probe beside its own request, so that finding out costs no request anything either.
 */
export class StoreHealth {
  away = false;
  private pause = firstPause;
  private probeAt = 0;
  private probing = false;
  private loggedAt = -Infinity;

  constructor(
    private readonly probe: () => Promise<void>,
    private readonly report: (error: unknown) => void,
    private readonly now: () => number = Date.now,
  ) {}

  failed(error: unknown): void {
    const now = this.now();
    if (!this.away) {
      this.away = true;
      this.pause = firstPause;
      this.probeAt = now + this.pause;
    }
    if (now - this.loggedAt < quietFor) return;
    this.loggedAt = now;
    this.report(error);
  }

  /** Called for each request while away. */
  look(): void {
    if (this.probing || this.now() < this.probeAt) return;
    this.probing = true;
    this.probe()
      .then(
        () => {
          this.away = false;
        },
        (error: unknown) => {
          this.pause = Math.min(this.pause * 2, longestPause);
          this.probeAt = this.now() + this.pause;
          this.failed(error);
        },
      )
      .finally(() => {
        this.probing = false;
      });
  }
}
