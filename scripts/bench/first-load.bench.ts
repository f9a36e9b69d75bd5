import { readdirSync, readFileSync } from 'node:fs';
import { join } from 'node:path';
import { gzipSync } from 'node:zlib';
import type { Bench } from './bench';
import { collectStaticImports } from './built-imports';

const targetKb = 200;

const isChartCode = (text: string) => /\becharts\b|zrender/i.test(text);

/** What index.html names, and the module of the ledger's page. */
function findRoots(clientFolder: string): string[] {
  const html = readFileSync(join(clientFolder, 'index.html'), 'utf8');
  const named = [...html.matchAll(/\/assets\/([^"]+\.js)"/g)].flatMap(([, name]) => name ?? []);
  const ledger = readdirSync(join(clientFolder, 'assets')).filter((name) => /^procedures-.+\.js$/.test(name));
  if (named.length === 0 || ledger.length !== 1) throw new Error('The built page is laid out differently.');
  return [...named, ...ledger];
}

export const bench: Bench = {
  name: 'First-load JavaScript of the ledger, gzipped',
  target: `under ${targetKb} kB, no chart library`,
  run: async ({ clientFolder, report }) => {
    const assetsFolder = join(clientFolder, 'assets');
    const files = collectStaticImports(assetsFolder, findRoots(clientFolder)).map((name) => {
      const bytes = readFileSync(join(assetsFolder, name));
      return { name, gzippedB: gzipSync(bytes).byteLength, hasCharts: isChartCode(bytes.toString()) };
    });
    const first = readFileSync(join(clientFolder, 'theme-first.js'));
    files.push({ name: 'theme-first.js', gzippedB: gzipSync(first).byteLength, hasCharts: false });
    for (const { name, gzippedB } of files.toSorted((one, other) => other.gzippedB - one.gzippedB))
      report(`  ${(gzippedB / 1000).toFixed(1).padStart(6)} kB  ${name}`);
    const totalKb = files.reduce((sum, { gzippedB }) => sum + gzippedB, 0) / 1000;
    const withCharts = files.filter(({ hasCharts }) => hasCharts).map(({ name }) => name);
    return {
      measured: `${totalKb.toFixed(0)} kB in ${files.length} files${withCharts.length > 0 ? `, charts in ${withCharts.join(', ')}` : ''}`,
      isMet: totalKb < targetKb && withCharts.length === 0,
    };
  },
};
