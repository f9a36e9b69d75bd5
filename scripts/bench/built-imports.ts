import { readFileSync } from 'node:fs';
import { join } from 'node:path';

/** What a built module needs before it runs; `import(…)` comes later and is not counted. */
const staticImport = /(?:\bfrom|\bimport)\s*["']\.\/([^"']+\.js)["']/g;

/** The names of built modules together with everything they import statically. */
export function collectStaticImports(assetsFolder: string, names: readonly string[]): string[] {
  const found = new Set(names);
  for (const name of found) {
    const text = readFileSync(join(assetsFolder, name), 'utf8');
    for (const [, imported] of text.matchAll(staticImport)) if (imported) found.add(imported);
  }
  return [...found].sort();
}
