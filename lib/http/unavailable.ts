/** Node.js's codes for a connection that cannot be made or broke off. */
const BROKEN = new Set(['ECONNREFUSED', 'ECONNRESET', 'EPIPE', 'ENOTFOUND', 'EHOSTUNREACH', 'ETIMEDOUT']);
/** PostgreSQL's classes 08 (connection) and codes for shutting down, starting up and too many connections (appendix A of its manual). */
const AWAY = /^(08...|57P0[123]|53300)$/;
/** What node-postgres says without a code. */
const SAID =
  /Connection terminated|timeout exceeded when trying to connect|Client has encountered a connection error/;

/** Whether an error says that the database is out of reach, itself or by what caused it. */
export function isDatabaseAway(error: unknown): boolean {
  for (let at = error; at instanceof Error; at = at.cause) {
    const code = 'code' in at && typeof at.code === 'string' ? at.code : '';
    if (BROKEN.has(code) || AWAY.test(code) || SAID.test(at.message)) return true;
    if (at instanceof AggregateError && at.errors.some(isDatabaseAway)) return true;
  }
  return false;
}
