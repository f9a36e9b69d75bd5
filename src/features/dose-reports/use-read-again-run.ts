import { useEffect, useRef, useState } from 'react';
import { useQueryClient } from '@tanstack/react-query';
import {
  readAgainPreviewSchema,
  readAgainResultsSchema,
  type ReadAgainPreview,
  type ReadAgainResult,
} from '../../../shared/contract/read-again';
import { request } from '../../lib/api';
import { doseReportsKey, fetchReadAgain } from './queries';

/** Read again and written in one request. */
const batchSize = 5;

type Stage = 'idle' | 'looking' | 'looked' | 'applying' | 'applied';

export type ReadAgainRun = {
  stage: Stage;
  previews: readonly ReadAgainPreview[];
  /** Files to look at, or to apply. */
  whole: number;
  results: readonly ReadAgainResult[];
  error: Error | null;
};

const idle: ReadAgainRun = { stage: 'idle', previews: [], whole: 0, results: [], error: null };

const fetchPreview = (id: string, signal: AbortSignal) =>
  request(`/api/dose-reports/${id}/read-again`, { schema: readAgainPreviewSchema, signal });

/** Every kept file that may be read again, looked at one after another, page by page. */
async function lookAtAll(onEach: (preview: ReadAgainPreview, whole: number) => void, signal: AbortSignal) {
  for (let cursor: string | null = ''; cursor !== null;) {
    const page = await fetchReadAgain(cursor, signal);
    const whole = page.counts.stored + page.counts.held + page.counts.refused;
    for (const { id } of page.items) onEach(await fetchPreview(id, signal), whole);
    cursor = page.nextCursor;
  }
}

/** Looks at everything without changing it, then applies what is chosen; can be stopped and taken up again. */
export function useReadAgainRun() {
  const [run, setRun] = useState(idle);
  const stopper = useRef<AbortController | null>(null);
  const client = useQueryClient();
  useEffect(() => () => stopper.current?.abort(), []);

  async function begin(stage: Stage, work: (signal: AbortSignal) => Promise<void>, end: Stage) {
    stopper.current?.abort();
    const controller = new AbortController();
    stopper.current = controller;
    setRun((was) => ({ ...was, stage, error: null }));
    try {
      await work(controller.signal);
      setRun((was) => ({ ...was, stage: end }));
    } catch (error) {
      setRun((was) => ({ ...was, stage: end, error: controller.signal.aborted ? null : (error as Error) }));
    }
  }

  const look = () => {
    setRun(idle);
    const add = (preview: ReadAgainPreview, whole: number) =>
      setRun((was) => ({ ...was, whole, previews: [...was.previews, preview] }));
    void begin('looking', (signal) => lookAtAll(add, signal), 'looked');
  };

  const apply = (ids: string[]) => {
    setRun((was) => ({ ...was, whole: ids.length, results: [] }));
    const work = async (signal: AbortSignal) => {
      for (let start = 0; start < ids.length; start += batchSize) {
        const { results } = await request('/api/dose-reports/read-again', {
          method: 'POST',
          body: { ids: ids.slice(start, start + batchSize) },
          schema: readAgainResultsSchema,
          signal,
        });
        setRun((was) => ({ ...was, results: [...was.results, ...results] }));
      }
    };
    void begin('applying', work, 'applied').then(async () => {
      await client.invalidateQueries({ queryKey: doseReportsKey });
      await client.invalidateQueries({ queryKey: ['procedures'] });
    });
  };

  return { run, look, apply, stop: () => stopper.current?.abort() };
}
