export interface Crumb {
	readonly label: string;
	readonly href: string;
}
