/** A clock that stands still until it is moved. */
export class TestClock {
  constructor(private at: number = Date.UTC(2026, 2, 2, 9, 0)) {}

  readonly now = (): number => this.at;

  /** Moves on by so many milliseconds. */
  advance(durationMs: number): void {
    this.at += durationMs;
  }

  set(at: number): void {
    this.at = at;
  }
}
