export interface Letter {
	readonly to: string;
	readonly subject: string;
	/** Plain text; a link stands on a line of its own. */
	readonly body: string;
}

interface Addressed {
	readonly to: string;
	/** The site's own address, from the settings and never from a request. */
	readonly origin: string;
}

const sign = '\n\n— Paperlarder\n';

export function confirmAddress({ to, origin }: Addressed, token: string): Letter {
	return {
		to,
		subject: 'Confirm your address',
		body: `Somebody, we hope you, asked for a Paperlarder account with this address.\n\nOpen this page within a day and type the password you chose:\n\n${origin}/sign-up/${token}\n\nIf it wasn’t you, leave it: without that password nothing happens.${sign}`
	};
}

export function alreadyKnown({ to, origin }: Addressed): Letter {
	return {
		to,
		subject: 'You already have an account',
		body: `Somebody, perhaps you, asked for a Paperlarder account with this address, and there is one already.\n\nSign in here:\n\n${origin}/sign-in\n\nor choose a new password here:\n\n${origin}/reset\n\nIf it wasn’t you, there is nothing to do.${sign}`
	};
}

export function signInLink({ to, origin }: Addressed, token: string, next: string): Letter {
	const query = next ? `?next=${encodeURIComponent(next)}` : '';
	return {
		to,
		subject: 'Your sign-in link',
		body: `Open this page within ten minutes to sign in. It works once:\n\n${origin}/sign-in/link/${token}${query}\n\nIf you didn’t ask for it, leave it.${sign}`
	};
}

export function resetLink({ to, origin }: Addressed, token: string): Letter {
	return {
		to,
		subject: 'Choose a new password',
		body: `Open this page within half an hour to choose a new password. It works once, and a newer one replaces it:\n\n${origin}/reset/${token}\n\nIf you didn’t ask for it, leave it: your password stays as it is.${sign}`
	};
}

export function passwordChanged({ to, origin }: Addressed): Letter {
	return {
		to,
		subject: 'Your password was changed',
		body: `The password of your Paperlarder account was changed just now, and your other browsers were signed out.\n\nIf it wasn’t you, choose a new one at once:\n\n${origin}/reset${sign}`
	};
}
