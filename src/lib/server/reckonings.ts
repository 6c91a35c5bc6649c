/** Keeps what was reckoned from a room until the room changes, for the names that were asked for last. */
export class Reckonings<T> {
	private readonly kept = new Map<string, { readonly revision: number; readonly answer: Promise<T> }>();

	/** @param most how many names are remembered */
	constructor(private readonly most: number) {}

	/** What `work` answers; once for all who ask while the room's revision is the same. A failure isn't kept. */
	async of(name: string, revision: number, work: () => Promise<T>): Promise<T> {
		const known = this.kept.get(name);
		this.kept.delete(name);
		const entry = known?.revision === revision ? known : { revision, answer: work() };
		this.kept.set(name, entry);
		for (const [oldest] of this.kept) {
			if (this.kept.size <= this.most) break;
			this.kept.delete(oldest);
		}
		try {
			return await entry.answer;
		} catch (error) {
			if (this.kept.get(name) === entry) this.kept.delete(name);
			throw error;
		}
	}
}
