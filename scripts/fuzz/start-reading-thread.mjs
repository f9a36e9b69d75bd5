// A worker thread starts without the loader that reads TypeScript: this brings it.
import { require as load } from 'tsx/cjs/api';

load('./reading-thread.ts', import.meta.url);
