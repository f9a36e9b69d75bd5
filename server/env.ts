import { z } from 'zod';

/** The port when PORT is unset; busy, the start takes the next free one. */
export const usualPort = 4600;

const optionalText = z
  .string()
  .trim()
  .optional()
  .transform((text) => (text ? text : null));

/** A calendar date that exists, as YYYY-MM-DD. */
const calendarDate = z.iso.date({ error: 'must be a date as YYYY-MM-DD' });

const logLevels = ['fatal', 'error', 'warn', 'info', 'debug', 'trace', 'silent'] as const;

/** One entry for each variable; an empty value counts as unset, as in a shell's `PORT= npm start`. */
const variables = z.object({
  PORT: z.coerce
    .number({ error: 'must be a number' })
    .int('must be a whole number')
    .min(1, 'must be at least 1')
    .max(65_535, 'must be at most 65535')
    .optional(),
  HOST: z.string().trim().default('127.0.0.1'),
  DATABASE_URL: z
    .string()
    .regex(/^postgres(ql)?:\/\//, 'must begin with postgresql://')
    .optional(),
  DATA_DIR: optionalText,
  LEEWARD_DEMO: z.enum(['yes', 'no'], { error: 'must be yes or no' }).optional(),
  DEMO_PASSWORD: z.string().optional(),
  DEMO_ANCHOR: calendarDate.optional(),
  TLS_CERT_FILE: optionalText,
  TLS_KEY_FILE: optionalText,
  REFUSED_KEEP_DAYS: z.coerce
    .number({ error: 'must be a number of days' })
    .int('must be a whole number of days')
    .min(0, 'must be 0 (for ever) or more')
    .max(36_500, 'must be at most 36500')
    .default(180),
  ARCHIVE_UNPACKED_MB: z.coerce
    .number({ error: 'must be a number of megabytes' })
    .int('must be a whole number of megabytes')
    .min(1, 'must be at least 1')
    .max(2000, 'must be at most 2000')
    .default(200),
  LOG_LEVEL: z.enum(logLevels, { error: `must be one of ${logLevels.join(', ')}` }).default('info'),
});

const environmentSchema = variables
  .refine((given) => (given.TLS_CERT_FILE === null) === (given.TLS_KEY_FILE === null), {
    path: ['TLS_CERT_FILE'],
    error: 'and TLS_KEY_FILE must be given together',
  })
  .transform((given) => ({
    /** TCP port of API and page. */
    port: given.PORT ?? usualPort,
    /** Whether PORT was given: then a busy port is an error, not a reason to take the next. */
    isPortGiven: given.PORT !== undefined,
    /** Address to listen on. */
    host: given.HOST,
    /** An existing PostgreSQL to use; null means the project's private one. */
    databaseUrl: given.DATABASE_URL ?? null,
    /** Folder for the private database and what belongs to it; null means `.data` in the checkout. */
    dataDirectory: given.DATA_DIR,
    /** Whether the fictional demo hospital is wanted: by default in the private database only. */
    isDemo: given.LEEWARD_DEMO ? given.LEEWARD_DEMO === 'yes' : given.DATABASE_URL === undefined,
    /** Password of the demo accounts; null means one made at random. */
    demoPassword: given.DEMO_PASSWORD ?? null,
    /** ISO date from whose month's first day the demo runs back; null means today. */
    demoAnchor: given.DEMO_ANCHOR ?? null,
    /** PEM files of certificate and key, both or neither. */
    tlsFiles:
      given.TLS_CERT_FILE && given.TLS_KEY_FILE
        ? { certificate: given.TLS_CERT_FILE, key: given.TLS_KEY_FILE }
        : null,
    /** How long the bytes of refused files are kept; 0: for ever. */
    refusedKeepDays: given.REFUSED_KEEP_DAYS,
    /** What all entries of a zip archive together may unpack to. */
    archiveUnpackedBytes: given.ARCHIVE_UNPACKED_MB * 1_048_576,
    logLevel: given.LOG_LEVEL,
  }));

export type Environment = z.infer<typeof environmentSchema>;

/** Every variable that can't be used, one line each. */
export class EnvironmentError extends Error {}

/** Reads the environment variables; throws an EnvironmentError that names everything wrong at once. */
export function readEnvironment(source: Record<string, string | undefined>): Environment {
  const given = Object.fromEntries(Object.entries(source).filter(([, value]) => value?.trim()));
  const parsed = environmentSchema.safeParse(given);
  if (parsed.success) return parsed.data;
  throw new EnvironmentError(
    parsed.error.issues.map((issue) => `${issue.path.join('.')} ${issue.message}`).join('\n'),
  );
}
