import pino from 'pino';
import { environmentSchema } from './env';

// Logging begins before the environment is checked as a whole; a wrong level is refused by name there.
const level = environmentSchema.shape.LOG_LEVEL.catch('info').parse(process.env.LOG_LEVEL);

/** One JSON line an event on standard output, UTC. */
export const log = pino({ level, base: null });
