/** How a button or a link that acts as one looks. */
export type Press = 'primary' | 'plain' | 'quiet' | 'danger';

/** The classes of a control that is pressed; `.press` is drawn in press.css. */
export const pressClass = (look: Press, small: boolean) =>
	`press ${look === 'quiet' ? 'press-quiet' : `mitred press-${look}`} ${small ? 'press-small' : ''}`;
