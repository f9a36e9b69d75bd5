/** Debian's Chromium. */
export const chromiumPath = '/usr/bin/chromium';

/** Runs as any user, root too, without a graphics card, and asks no other host for anything. */
export const chromiumFlags = [
  '--no-sandbox',
  '--disable-gpu',
  '--disable-quic',
  '--no-first-run',
  '--disable-background-networking',
  '--disable-component-update',
  '--disable-sync',
];
