import { invalidate } from '$app/navigation';
import { createQuery, useQueryClient } from '@tanstack/svelte-query';
import { flapsOf, type TodayFlap } from './flaps';

export interface TodayData {
	readonly here: { readonly id: string } | null;
	readonly mode: 'each' | 'queue';
	readonly on: string;
	readonly revision: number;
	readonly flaps: readonly TodayFlap[];
}

export const todayKey = ({ here, mode, on }: Pick<TodayData, 'here' | 'mode' | 'on'>) => [
	'today',
	here?.id,
	mode,
	on
];

/** The flaps as `load` last gave them, asked for anew when somebody comes back to the page. */
export function todayQuery(data: () => TodayData) {
	const queries = useQueryClient();
	$effect.pre(() => {
		const loaded = data();
		queries.setQueryData(todayKey(loaded), [...loaded.flaps]);
	});
	return createQuery(() => {
		const { here, mode, on, revision, flaps } = data();
		return {
			queryKey: todayKey({ here, mode, on }),
			queryFn: async ({ signal }) => {
				const answer = await fetch(`/api/rooms/${here?.id}/today?mode=${mode}&on=${on}`, {
					signal
				});
				if (!answer.ok) throw new Error(`Today answered ${answer.status}`);
				const today = await answer.json();
				if (today.revision !== revision) await invalidate('paperlarder:today');
				return flapsOf(today);
			},
			initialData: [...flaps],
			staleTime: 30_000
		};
	});
}
