import "server-only";

/** A token bucket: it holds `capacity` and gains `refill` each `interval` milliseconds. */
export interface BucketShape {
  capacity: number;
  refill: number;
  interval: number;
}

/**
 * The bucket for so many a minute. The store refills whole intervals, so they are many and small: one token at a time while
 * that is slower than ten a second. Never more than `perMinute` in the long run.
 */
export function bucketFor(perMinute: number): BucketShape {
  if (perMinute <= 600) return { capacity: perMinute, refill: 1, interval: Math.ceil(60_000 / perMinute) };
  return { capacity: perMinute, refill: Math.floor(perMinute / 60), interval: 1_000 };
}

/** Milliseconds from a bucket's last refill until it holds `wanted`, given what it held then. */
export function waitFor({ refill, interval }: BucketShape, held: number, wanted: number): number {
  return Math.max(0, Math.ceil((wanted - held) / refill)) * interval;
}
