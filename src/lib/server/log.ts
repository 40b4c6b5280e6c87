import pino from 'pino';

/** One JSON line an event on standard output, UTC. */
export const log = pino({ level: process.env.LOG_LEVEL ?? 'info', base: null });
