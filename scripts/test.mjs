import { launch } from './launch.mjs';

await launch('./run-tests.ts');
