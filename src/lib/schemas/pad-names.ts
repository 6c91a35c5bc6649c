/** The names of a pasted list, a line each; a blank line leaves its design numbered. */
export function namesIn(list: string): string[] {
	const lines = list.trimEnd().split('\n');
	return lines.length === 1 && lines[0] === '' ? [] : lines.map((line) => line.trim());
}

/** What a pad's designs are called, front by front: those that nobody named are numbered. */
export function designNames(list: string, designs: number): string[] {
	const names = namesIn(list);
	return Array.from({ length: designs }, (_, nth) => names[nth] || designNumbered(nth, designs));
}

/** `Design 02` of twelve: as wide as the last, so that rows sorted by name stand in the pad's order. */
export function designNumbered(nth: number, designs: number): string {
	return `Design ${String(nth + 1).padStart(String(designs).length, '0')}`;
}
