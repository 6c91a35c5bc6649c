/** What superforms hands over for a field (`$errors.name`), or one sentence. */
export type FieldError = string | string[] | undefined;

export const fieldErrors = (error: FieldError): string[] =>
	error === undefined ? [] : typeof error === 'string' ? [error] : error;

/** The ids that an input names in `aria-describedby`, or nothing. */
export function describedBy(id: string, hint: boolean, error: boolean): string | undefined {
	const ids = [hint && `${id}-hint`, error && `${id}-error`].filter(Boolean);
	return ids.length ? ids.join(' ') : undefined;
}
