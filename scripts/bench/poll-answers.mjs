// Fetches an address again and again until told to stop, in a process of its own: whoever sends a large file meanwhile
// would hold up its own clock.
import { setTimeout } from 'node:timers/promises';

const pauseMs = 20;
const { POLLED_ADDRESS: address = '', POLLED_COOKIE: cookie = '' } = process.env;

async function fetchOnce() {
  const startedMs = performance.now();
  const response = await fetch(address, { headers: { cookie } });
  await response.text();
  if (!response.ok) throw new Error(`${address} answered ${response.status}`);
  return performance.now() - startedMs;
}

let isOver = false;
process.on('message', () => (isOver = true));
for (let warmUps = 0; warmUps < 5; warmUps += 1) await fetchOnce();
process.send?.('ready');
const timesMs = [];
while (!isOver) {
  timesMs.push(await fetchOnce());
  await setTimeout(pauseMs);
}
process.send?.(timesMs);
process.disconnect();
