import { mkdirSync, writeFileSync } from 'node:fs';
import { fileURLToPath } from 'node:url';
import { readableGroups } from './samples/readable-samples';
import type { Sample } from './samples/sample';
import { unreadableSamples } from './samples/unreadable-samples';
import { variations } from './samples/variations.table-data';

const folder = fileURLToPath(new URL('../samples/', import.meta.url));

const introduction = `# Samples

Synthetic dose reports for tests, demonstrations and support. Every file was written by \`npm run samples\` from the
descriptions in \`scripts/samples/\` with the writer in \`server/dicom-writer/\`; the same bytes come out each time.
Makers, models, serial numbers, stations, institution and persons are invented; no file stems from a real machine or
patient.

Beside each file stands what the reader must make of it (\`.expected.json\`), derived from the writer's input and not
from the reader: \`outcome\`, then either \`report\` and \`warningCodes\`, or \`reasonCode\`. Files that are held print as
"refused" with the same code.

"valid" means: dciodvfy (dicom3tools) finds no error in it. Its deflated sample is checked after inflating, because
that tool does not inflate.

`;

function line({ fileName, how, isValid, expected }: Sample): string {
  const outcome = expected.outcome === 'read' ? 'read' : `refused, ${expected.reasonCode}`;
  return `- **${fileName}** (${isValid ? 'valid, ' : ''}${outcome}): ${how}\n`;
}

mkdirSync(folder, { recursive: true });
const groups: Record<string, Sample[]> = { ...readableGroups(), 'Not read': unreadableSamples() };
const samples = Object.values(groups).flat();
for (const { fileName, bytes, expected, isValid } of samples) {
  writeFileSync(folder + fileName, bytes);
  const name = fileName.replace(/\.[^.]+$/, '');
  writeFileSync(`${folder}${name}.expected.json`, `${JSON.stringify({ fileName, isValid, ...expected })}\n`);
}
const list = Object.entries(groups).map(([title, members]) => `## ${title}\n\n${members.map(line).join('')}`);
const numbers = samples.map(({ fileName }) => /^\d+/.exec(fileName)?.[0]);
const shown = variations.map(([what, ...shownBy]) => {
  const unknown = shownBy.find((number) => !numbers.includes(number));
  if (unknown) throw new Error(`no sample ${unknown} for ${what}`);
  return `- ${what}: ${shownBy.join(', ')}\n`;
});
writeFileSync(
  `${folder}README.md`,
  `${introduction}## Where to find what\n\n${shown.join('')}\n${list.join('\n')}`,
);
process.stdout.write(`${samples.length} samples written to samples/\n`);
