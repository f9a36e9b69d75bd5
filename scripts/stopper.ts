/** Signals this close together are one: npm hands a terminal's Ctrl-C to its child a second time. */
const sameSignalMs = 700;

/**
 * Ends the command tidily: on Ctrl-C, TERM or hang-up, or by a call, what was begun is ended in
 * reverse order. A second Ctrl-C ends the process at once.
 */
export class Stopper {
  private readonly tasks: (() => Promise<void>)[] = [];
  private stopping: Promise<void> | null = null;
  private firstSignalMs = 0;

  constructor(
    private readonly report: (line: string) => void,
    private readonly exitCodeWhenTold: number,
  ) {
    for (const signal of ['SIGINT', 'SIGTERM', 'SIGHUP'] as const) {
      process.on(signal, () => this.takeSignal());
    }
  }

  /** Whether a signal asked for the end: what fails after that fails because of it. */
  get wasTold(): boolean {
    return this.firstSignalMs > 0;
  }

  /** Adds what has to be ended; what was added last is ended first. */
  add(end: () => Promise<void>): void {
    this.tasks.push(end);
  }

  stop(): Promise<void> {
    return (this.stopping ??= this.runTasks());
  }

  private async runTasks(): Promise<void> {
    for (const task of this.tasks.toReversed()) {
      await task().catch((error: unknown) => this.report(`While stopping: ${String(error)}`));
    }
  }

  private takeSignal(): void {
    if (this.stopping) {
      if (Date.now() - this.firstSignalMs > sameSignalMs) process.exit(130);
      return;
    }
    this.firstSignalMs = Date.now();
    this.report('Stopping (once more to end at once)');
    void this.stop().then(() => process.exit(this.exitCodeWhenTold));
  }
}
