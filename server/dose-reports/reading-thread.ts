import { once } from 'node:events';
import { setImmediate } from 'node:timers/promises';
import { Worker, type TransferListItem } from 'node:worker_threads';
import type { DoseReportReading } from '../dicom/read-dose-report';
import { joinBytes } from '../kernel/join-bytes';
import { readingLimits } from './reading-limits';
import type { ReadingAnswer, ReadingQuestion } from './reading-messages';
import { TimeLimit } from './time-limit';

/** A thread of its own for reading, with a bounded heap: a hostile file can end it, but not the server. */
export class ReadingThread {
  private readonly closing = new AbortController();

  private constructor(private readonly worker: Worker) {
    // Nobody may be asking when it fails; whoever asks next learns of it.
    worker.on('error', () => undefined);
    worker.once('exit', () => this.closing.abort(new Error('the reading thread has ended')));
  }

  static async start(): Promise<ReadingThread> {
    const worker = new Worker(new URL('./start-reading-worker.mjs', import.meta.url), {
      resourceLimits: {
        maxOldGenerationSizeMb: readingLimits.heapMb,
        maxYoungGenerationSizeMb: readingLimits.youngHeapMb,
      },
    });
    const thread = new ReadingThread(worker);
    try {
      await thread.hear('ready');
    } catch (error) {
      await thread.end();
      throw error;
    }
    worker.unref();
    return thread;
  }

  /** Rejects when reading takes longer or needs more memory than it may: the thread is then of no further use. */
  async read(bytes: Uint8Array): Promise<DoseReportReading> {
    this.worker.ref();
    const copy = await joinBytes([bytes]);
    const { reading, eventCount } = await this.ask('reading', { bytes: copy }, [copy.buffer]);
    if (reading.outcome === 'read') {
      const { events } = reading.report;
      while (events.length < eventCount) {
        await setImmediate();
        events.push(...(await this.ask('events', 'next events')).events);
      }
    }
    this.worker.unref();
    return reading;
  }

  async end(): Promise<void> {
    await this.worker.terminate();
  }

  private ask<K extends ReadingAnswer['kind']>(
    kind: K,
    question: ReadingQuestion,
    transfer: TransferListItem[] = [],
  ): Promise<Extract<ReadingAnswer, { kind: K }>> {
    this.worker.postMessage(question, transfer);
    return this.hear(kind);
  }

  private async hear<K extends ReadingAnswer['kind']>(kind: K): Promise<Extract<ReadingAnswer, { kind: K }>> {
    const limit = new TimeLimit(readingLimits.timeMs);
    const signal = AbortSignal.any([this.closing.signal, limit.signal]);
    const [answer] = (await once(this.worker, 'message', { signal }).finally(() => limit.end())) as [
      ReadingAnswer,
    ];
    if (answer.kind !== kind) throw new Error(`the reading thread answered ${answer.kind}, not ${kind}`);
    return answer as Extract<ReadingAnswer, { kind: K }>;
  }
}
