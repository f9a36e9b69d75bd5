const lookEveryMs = 250;

/** The reason of a signal that a `TimeLimit` gave. */
export class TookTooLong extends Error {}

/**
 * A limit of time for work in a thread: over when so much time has passed and this process has also had so much of a
 * processor, so that a busy machine alone stops nothing; or in any case after six times as long.
 */
export class TimeLimit {
  private readonly controller = new AbortController();
  private readonly startedMs = performance.now();
  private readonly usedBefore = process.cpuUsage();
  private readonly looking: NodeJS.Timeout;
  readonly signal: AbortSignal = this.controller.signal;

  constructor(private readonly limitMs: number) {
    this.looking = setInterval(() => this.look(), Math.min(limitMs, lookEveryMs)).unref();
  }

  end(): void {
    clearInterval(this.looking);
  }

  private look(): void {
    const passedMs = performance.now() - this.startedMs;
    const { user, system } = process.cpuUsage(this.usedBefore);
    const hadMs = Math.min(passedMs, (user + system) / 1000);
    if (hadMs >= this.limitMs || passedMs >= 6 * this.limitMs) this.controller.abort(new TookTooLong());
  }
}
