import { setFlagsFromString } from 'node:v8';
import { launch } from './launch.mjs';

// Where a machine has much memory, V8 lets the heap grow to several times what is alive before it tidies up. Half as
// much again is enough: measured while receiving hundreds of files, 100 MB less in all and no slower.
setFlagsFromString('--heap-growing-percent=50');

await launch('./serve.ts');
