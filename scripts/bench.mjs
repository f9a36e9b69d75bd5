import { launch } from './launch.mjs';

await launch('./run-bench.ts');
