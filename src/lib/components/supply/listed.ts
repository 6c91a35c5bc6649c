import type { SupplyRow } from '$lib/server/queries/supplies';

/** What a list shows of a supply; lengths in 1/320 mm. */
export type ListedSupply = Pick<
	SupplyRow,
	| ('id' | 'group' | 'kind' | 'name' | 'collection' | 'bin' | 'amount' | 'count' | 'full' | 'unit')
	| ('w' | 'h' | 'width' | 'faces' | 'colours' | 'offcut' | 'arrives' | 'lentUntil' | 'borrowedUntil')
	| ('reach' | 'size' | 'shape' | 'entered')
> & { readonly picture: boolean };

/** A list holds fifty of these in its page, so they carry no more than is shown. `on` is today, YYYY-MM-DD. */
export function listed(row: SupplyRow, on: string): ListedSupply {
	const { id, group, kind, name, collection, bin, amount, count, full, unit } = row;
	const { w, h, width, faces, colours, offcut, lentUntil, borrowedUntil } = row;
	const { reach, size, shape, entered } = row;
	const arrives = row.arrives && row.arrives > on ? row.arrives : null;
	return {
		...{ id, group, kind, name, collection, bin, amount, count, full, unit },
		...{ w, h, width, faces, colours, offcut, arrives, lentUntil, borrowedUntil },
		...{ reach, size, shape, entered },
		picture: row.picture !== null
	};
}
