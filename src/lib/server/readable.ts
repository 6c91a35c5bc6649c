import { Unreadable } from '../domain/exchange';
import { Invalid } from './errors';

/** Reads a document's measures. @throws {Invalid} with every issue, each under `under`. */
export function readable<T>(read: () => T, under: readonly (string | number)[] = []): T {
	try {
		return read();
	} catch (error) {
		if (!(error instanceof Unreadable)) throw error;
		throw new Invalid(
			error.issues.map(({ path, message }) => ({
				path: [...under, ...path.split('.').filter((part) => part !== '')],
				message
			}))
		);
	}
}
