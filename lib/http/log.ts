import pino from 'pino';

export const log = pino({
  name: 'plumbrow',
  level: process.env.LOG_LEVEL ?? (process.env.NODE_ENV === 'test' ? 'silent' : 'info'),
  redact: ['*.password', '*.token', 'headers.authorization', 'headers.cookie'],
});
