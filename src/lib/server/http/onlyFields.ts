import { AppError } from '../errors';

/** @throws AppError invalid, naming the first field of `body` that is not `known` */
export function onlyFields(body: Record<string, unknown>, known: readonly string[]): void {
	const [odd] = Object.keys(body).filter((key) => !known.includes(key));
	if (odd === undefined) return;
	const issues = [{ path: odd, message: 'There is no such field here.' }];
	throw new AppError('invalid', `Nothing was saved: there is no field “${odd}” here.`, { issues });
}
