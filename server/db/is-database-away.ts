/** Classes of PostgreSQL errors that mean the connection or the server ended, not the statement (appendix A). */
const connectionClass = /^(08...|57P0[1-5]|53300)$/;
const networkCodes = new Set(['ECONNREFUSED', 'ECONNRESET', 'EPIPE', 'ETIMEDOUT']);
/** The driver and the mapper tell of a lost connection by name or in words only. */
const lostConnection = /Connection terminated|timeout exceeded when trying to connect|AlreadyReleasedError/;

/** Did a statement fail because the database was away? Then it may be tried again as it is. */
export function isDatabaseAway(error: unknown): boolean {
  const { code, name = '', message = '' } = error as Partial<Error> & { code?: string };
  if (code !== undefined && (connectionClass.test(code) || networkCodes.has(code))) return true;
  return lostConnection.test(message) || lostConnection.test(name);
}
