import { ConfigError } from '../config.ts';

/** Why a start failed, in sentences for whoever started it. */
export function explain(error: unknown): readonly string[] {
  if (error instanceof ConfigError) return error.sentences;
  if (!(error instanceof Error)) return [String(error)];
  const code = 'code' in error ? error.code : null;
  switch (code) {
    case 'EADDRINUSE':
      return ['Another program already listens on this port: set PORT to another one.'];
    case 'EACCES':
      return ['This port may not be used by an ordinary user: set PORT to one above 1023.'];
    case 'EADDRNOTAVAIL':
      return ['HOST is not an address of this machine.'];
    case 'ECONNREFUSED':
    case 'ENOTFOUND':
    case 'ETIMEDOUT':
      return ['The database does not answer at the address in DATABASE_URL.'];
    case '28P01':
    case '28000':
      return ['The database refuses the user or the password in DATABASE_URL.'];
    case '3D000':
      return ['The database that DATABASE_URL names does not exist.'];
    default:
      return [error.message];
  }
}
