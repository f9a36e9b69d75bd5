import { launch } from './launch.mjs';

await launch('./run-dev.ts');
