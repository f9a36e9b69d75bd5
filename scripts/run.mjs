import { launch } from './launch.mjs';

// node scripts/run.mjs NAME PARAMETERS… runs NAME.ts as if it had been called itself.
const [name] = process.argv.splice(2, 1);
await launch(`./${name}.ts`);
