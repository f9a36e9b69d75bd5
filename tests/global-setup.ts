import type { TestProject } from 'vitest/node';
import { makeTemplateDatabase } from './template-database';

type Shared = { made: ReturnType<typeof makeTemplateDatabase>; users: number };

/** Vitest runs this file once for each project, each time as a module of its own: they meet here. */
const meetingPlace = globalThis as typeof globalThis & { leewardTemplate?: Shared };

/** Makes the template database for the first project that asks, and tells every project where it is. */
export async function setup(project: TestProject): Promise<() => Promise<void>> {
  const shared = (meetingPlace.leewardTemplate ??= { made: makeTemplateDatabase(), users: 0 });
  shared.users += 1;
  const { serverUrl, templateName, remove } = await shared.made;
  project.provide('templateDatabase', { serverUrl, templateName });
  return async () => {
    shared.users -= 1;
    if (shared.users > 0) return;
    delete meetingPlace.leewardTemplate;
    await remove();
  };
}
