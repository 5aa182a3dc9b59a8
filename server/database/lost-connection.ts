/** Codes of a database (or the way to it) that is stopping, starting, full or not there. */
const codes = /^(08...|57P0[1-3]|53300|ECONNREFUSED|ECONNRESET|EPIPE|ETIMEDOUT|ENOENT)$/;
/** What the driver says without a code. */
const words =
  /^(Connection terminated|timeout exceeded when trying to connect|Client has encountered a connection error)/;

/** Whether a question failed because the database could not be reached, so that it may be asked again. */
export function isLostConnection(error: unknown): boolean {
  if (!(error instanceof Error)) return false;
  if ('code' in error && typeof error.code === 'string' && codes.test(error.code)) return true;
  return words.test(error.message) || isLostConnection(error.cause);
}
