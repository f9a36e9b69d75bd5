import { launch } from './launch.mjs';

await launch('./serve.ts');
