import pino from 'pino';

export type Log = pino.Logger;

/** One JSON object a line. Cookies, passwords and tokens are removed wherever they stand. */
export function createLog(level: string, destination?: pino.DestinationStream): Log {
  const options: pino.LoggerOptions = {
    level,
    base: null,
    timestamp: pino.stdTimeFunctions.isoTime,
    formatters: { level: (label) => ({ level: label }) },
    redact: {
      paths: [
        'req.headers.cookie',
        'req.headers.authorization',
        'res.headers["set-cookie"]',
        'password',
        '*.password',
        'token',
        '*.token',
      ],
      remove: true,
    },
  };
  return destination === undefined ? pino(options) : pino(options, destination);
}

/** For last words: each line is out before the next one, and before the process ends. */
export const createLastLog = (): Log => createLog('info', pino.destination({ sync: true }));
