import { createContext } from 'svelte';

/** What the room measures in; what is set for a page holds for every length on it. */
export type Units = 'in' | 'mm' | 'cm';

const [getUnits, setUnits] = createContext<() => Units>();

export { setUnits };

/** The room's units, read again whenever they change; inches where nobody said. */
export function roomUnits(): () => Units {
	try {
		return getUnits();
	} catch {
		return () => 'in';
	}
}

/** The unit of the other system, for saying a length both ways. */
export const otherUnit = (unit: string): Units => (unit === 'in' || unit === 'yd' ? 'mm' : 'in');
