/** What one line may draw on: pools by number. */
export interface Claim {
	readonly amount: number;
	readonly pools: readonly number[];
}

/**
 * Serves every claim from the pools, or answers null: a maximum flow by augmenting paths. `drawn[c][p]` is what
 * claim c takes from pool p.
 */
export function serveClaims(claims: readonly Claim[], pools: readonly number[]): number[][] | null {
	const left = [...pools];
	const drawn = claims.map(() => pools.map(() => 0));
	for (const [c, claim] of claims.entries()) {
		let open = claim.amount;
		while (open > 0) {
			const moved = augment(claims, left, drawn, c, open, new Set());
			if (moved === 0) return null;
			open -= moved;
		}
	}
	return drawn;
}

/** Takes up to `most` for claim c, if need be by sending other claims to other pools. */
function augment(
	claims: readonly Claim[],
	left: number[],
	drawn: number[][],
	c: number,
	most: number,
	seen: Set<number>
): number {
	for (const pool of claims[c]?.pools ?? []) {
		if (seen.has(pool)) continue;
		seen.add(pool);
		let free = Math.min(most, left[pool] ?? 0);
		if (free > 0) left[pool] = (left[pool] ?? 0) - free;
		for (let other = 0; free === 0 && other < claims.length; other++) {
			const held = drawn[other]?.[pool] ?? 0;
			if (other === c || held === 0) continue;
			free = augment(claims, left, drawn, other, Math.min(most, held), seen);
			if (free > 0) take(drawn, other, pool, -free);
		}
		if (free > 0) {
			take(drawn, c, pool, free);
			return free;
		}
	}
	return 0;
}

function take(drawn: number[][], claim: number, pool: number, amount: number): void {
	const row = drawn[claim];
	if (row) row[pool] = (row[pool] ?? 0) + amount;
}
