import { sayProblem } from '$lib/components/ui/toast';

export type ThemeName = 'system' | 'light' | 'dark';

export const THEME_NAMES: readonly { readonly value: ThemeName; readonly label: string }[] = [
	{ value: 'system', label: 'As this device' },
	{ value: 'light', label: 'Light' },
	{ value: 'dark', label: 'Dark' }
];

/** Wears a theme at once, and has the server remember it for this browser. */
export async function wearTheme(theme: ThemeName) {
	const before = document.documentElement.dataset.theme;
	document.documentElement.dataset.theme = theme;
	const sent = await fetch('/theme', { method: 'POST', body: new URLSearchParams({ theme }) }).catch(
		() => null
	);
	if (sent?.ok) return;
	document.documentElement.dataset.theme = before;
	sayProblem('The theme wasn’t kept: the server couldn’t be reached.', () => wearTheme(theme));
}
