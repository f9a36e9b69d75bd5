import { spawn, type ChildProcess } from 'node:child_process';
import { createInterface } from 'node:readline';
import { setTimeout as pause } from 'node:timers/promises';

/** Starts the server on a port, waits until it listens, and ends it without warning. */
export class KillableServer {
  private child: ChildProcess | null = null;

  constructor(
    private readonly databaseUrl: string,
    private readonly folder: string,
    private readonly port: number,
  ) {}

  get url(): string {
    return `http://127.0.0.1:${this.port}`;
  }

  get isRunning(): boolean {
    return this.child?.exitCode === null && this.child.signalCode === null;
  }

  async start(): Promise<void> {
    const child = spawn(
      process.execPath,
      ['--import', 'tsx', 'tests/crash/serve.ts', this.databaseUrl, this.folder],
      {
        stdio: ['ignore', 'pipe', 'inherit'],
        env: { ...process.env, PORT: String(this.port), LEEWARD_DEMO: 'no', LOG_LEVEL: 'fatal' },
      },
    );
    this.child = child;
    await new Promise<void>((resolve, reject) => {
      child.once('exit', (code, signal) =>
        reject(new Error(`the server ended with ${signal ?? code} before it listened`)),
      );
      createInterface({ input: child.stdout }).on('line', (line) => {
        if (line.startsWith('ready ')) resolve();
      });
    });
  }

  /** Waits until it answers with its database again: it must live through the loss by itself. */
  async recovers(): Promise<void> {
    const isWell = () =>
      fetch(`${this.url}/api/health`).then(
        ({ ok }) => ok,
        () => false,
      );
    while (!(await isWell())) {
      if (!this.isRunning) throw new Error('the server ended with its database');
      await pause(100);
    }
  }

  async kill(): Promise<void> {
    const { child } = this;
    if (!child || !this.isRunning) return;
    const gone = new Promise((resolve) => child.once('exit', resolve));
    child.kill('SIGKILL');
    await gone;
  }
}
