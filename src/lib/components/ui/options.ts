/** One choice of a list. `note` is a second line where the list has room for one. */
export interface Option {
	readonly value: string;
	readonly label: string;
	readonly note?: string;
	readonly disabled?: boolean;
}

export type Options = readonly (Option | { readonly label: string; readonly options: readonly Option[] })[];
