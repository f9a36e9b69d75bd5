import { describe, expect, it } from 'vitest';
import { EnvironmentError, readEnvironment } from './env';

describe('readEnvironment', () => {
  it('takes the documented values when nothing is set, and empty counts as unset', () => {
    expect(readEnvironment({ PORT: '', HOST: ' ' })).toMatchObject({
      port: 4600,
      isPortGiven: false,
      host: '127.0.0.1',
      databaseUrl: null,
      isDemo: true,
      demoPassword: null,
      tlsFiles: null,
    });
  });

  it('writes no demo hospital into an existing database unless asked', () => {
    const url = 'postgresql://somebody@db.example/leeward';
    expect(readEnvironment({ DATABASE_URL: url }).isDemo).toBe(false);
    expect(readEnvironment({ DATABASE_URL: url, LEEWARD_DEMO: 'yes' }).isDemo).toBe(true);
    expect(readEnvironment({ LEEWARD_DEMO: 'no' }).isDemo).toBe(false);
  });

  it('tells a chosen port from the usual one', () => {
    expect(readEnvironment({ PORT: '4600' })).toMatchObject({ port: 4600, isPortGiven: true });
  });

  it.each([
    ['PORT', '0'],
    ['PORT', '70000'],
    ['PORT', 'http'],
    ['DATABASE_URL', 'mysql://db'],
    ['LEEWARD_DEMO', 'maybe'],
    ['DEMO_ANCHOR', '2026-02-30'],
    ['LOG_LEVEL', 'loud'],
    ['REFUSED_KEEP_DAYS', '-1'],
    ['ARCHIVE_UNPACKED_MB', '0'],
    ['TLS_CERT_FILE', 'cert.pem'],
  ])('refuses %s=%s and names the variable', (name, value) => {
    expect(() => readEnvironment({ [name]: value })).toThrow(new RegExp(`^${name} `));
  });

  it('keeps refused bytes for half a year and unpacks 200 MB unless told otherwise', () => {
    expect(readEnvironment({})).toMatchObject({ refusedKeepDays: 180, archiveUnpackedBytes: 209_715_200 });
    expect(readEnvironment({ REFUSED_KEEP_DAYS: '0' }).refusedKeepDays).toBe(0);
  });

  it('names everything that is wrong at once', () => {
    expect(() => readEnvironment({ PORT: 'x', LOG_LEVEL: 'y' })).toThrow(EnvironmentError);
    expect(() => readEnvironment({ PORT: 'x', LOG_LEVEL: 'y' })).toThrow(/PORT .*\nLOG_LEVEL /);
  });
});
