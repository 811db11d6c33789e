import { pino, type Logger } from 'pino';
import type { Settings } from '../settings.ts';

export type Log = Logger;

/** One line of JSON per event. Bodies, cookies and tokens are never logged. */
export const createLog = ({ LOG_LEVEL }: Pick<Settings, 'LOG_LEVEL'>): Log =>
  pino({
    level: LOG_LEVEL,
    base: null,
    timestamp: pino.stdTimeFunctions.isoTime,
    redact: {
      paths: ['*.password', '*.token', '*.ceilingMinor', '*.reserveMinor', 'req.headers', 'res.headers'],
      remove: true,
    },
  });
