import type { ClientRateLimitInfo, Options, Store } from 'express-rate-limit';

interface Attempts {
  totalHits: number;
  endsAt: number;
}

/** Counts attempts in memory by the application's own clock, a fixed window after the first one. */
export class AttemptStore implements Store {
  readonly localKeys = true;
  private readonly attempts = new Map<string, Attempts>();
  private windowMs = 0;

  constructor(private readonly now: () => number) {}

  init(options: Options): void {
    this.windowMs = options.windowMs;
  }

  get(key: string): ClientRateLimitInfo | undefined {
    const attempts = this.current(key);
    return attempts && this.info(attempts);
  }

  increment(key: string): ClientRateLimitInfo {
    const standing = this.current(key);
    if (standing === undefined) this.dropEnded();
    const attempts = standing ?? { totalHits: 0, endsAt: this.now() + this.windowMs };
    attempts.totalHits += 1;
    this.attempts.set(key, attempts);
    return this.info(attempts);
  }

  decrement(key: string): void {
    const attempts = this.current(key);
    if (attempts) attempts.totalHits = Math.max(0, attempts.totalHits - 1);
  }

  resetKey(key: string): void {
    this.attempts.delete(key);
  }

  /** The limiter compares the end of the window with the machine's clock, so it is given on that one. */
  private info({ totalHits, endsAt }: Attempts): ClientRateLimitInfo {
    return { totalHits, resetTime: new Date(Date.now() + endsAt - this.now()) };
  }

  private current(key: string): Attempts | undefined {
    const attempts = this.attempts.get(key);
    return attempts && attempts.endsAt > this.now() ? attempts : undefined;
  }

  /** Windows are few and short: sweeping them whenever one begins keeps the memory bounded by what is live. */
  private dropEnded(): void {
    for (const [key, { endsAt }] of this.attempts) if (endsAt <= this.now()) this.attempts.delete(key);
  }
}
