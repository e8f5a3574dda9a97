import { type Logger, pino, stdSerializers } from 'pino';

export type { Logger };

/** JSON lines on standard output. What could hold a secret never reaches them. */
export function createLogger(level: string): Logger {
  return pino({
    level,
    serializers: { error: stdSerializers.err },
    redact: ['*.password', '*.cookie', '*.authorization', '*.token'],
  });
}
