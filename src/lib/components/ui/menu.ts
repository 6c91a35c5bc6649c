import type { Component } from 'svelte';

/** A line of a menu: it goes somewhere, or does something. */
export interface MenuItem {
	readonly label: string;
	readonly icon?: Component<{ 'aria-hidden'?: 'true' }>;
	readonly href?: string;
	readonly onSelect?: () => void;
	readonly danger?: boolean;
	readonly disabled?: boolean;
	/** The one of its group that holds now. */
	readonly current?: boolean;
}

export interface MenuGroup {
	readonly heading?: string;
	readonly items: readonly MenuItem[];
}
