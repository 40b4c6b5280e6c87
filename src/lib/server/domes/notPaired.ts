import { problem } from '../http/problem';

/** The answer to a browser that holds no good screen token. */
export const notPaired = (): Response =>
	problem(401, 'This browser is not a screen of any dome. Pair it with the code it shows.');
