import { createTransport } from 'nodemailer';
import type { Database } from '../db/client';
import { describeError, log } from '../log';
import { markFailed, markSent, takeLetter } from '../services/outbox';

const LOOK_EVERY_MS = 1_000;

interface Post {
	readonly smtpUrl: string;
	readonly from: string;
}

/** Sends what the outbox owes until told to stop. No request ever waits for the mail server. */
export function startSender(database: Pick<Database, 'write'>, post: Post): () => Promise<void> {
	const transport = createTransport(
		{ url: post.smtpUrl, connectionTimeout: 10_000, greetingTimeout: 10_000, socketTimeout: 20_000 },
		{ from: post.from }
	);
	let stopped = false;
	let timer: NodeJS.Timeout;
	const round = async () => {
		try {
			while (!stopped && (await sendOne()));
		} catch (error) {
			log.error(describeError(error), 'mail.round-failed');
		}
		if (!stopped) timer = setTimeout(() => (current = round()), LOOK_EVERY_MS);
	};

	/** @returns whether there was a letter to send */
	const sendOne = async (): Promise<boolean> => {
		const letter = await database.write(takeLetter);
		if (!letter) return false;
		try {
			await transport.sendMail({
				to: { name: '', address: letter.recipient },
				subject: letter.subject,
				text: letter.body,
				messageId: letter.messageId,
				date: new Date(letter.createdAt)
			});
		} catch (error) {
			const failure = whyFailed(error);
			const { dead } = await database.write((tx) => markFailed(tx, letter, failure));
			log[dead ? 'error' : 'warn'](
				{ letter: letter.id, code: failure.code },
				dead ? 'mail.dead' : 'mail.later'
			);
			return true;
		}
		await database.write((tx) => markSent(tx, letter.id));
		log.info({ letter: letter.id }, 'mail.sent');
		return true;
	};

	let current = round();
	return async () => {
		stopped = true;
		clearTimeout(timer);
		transport.close();
		await current;
	};
}

/** An SMTP answer of 5xx is a refusal for good; everything else may pass. */
function whyFailed(error: unknown): { code: string; permanent: boolean } {
	const { responseCode, code } = error as { responseCode?: number; code?: string };
	return { code: String(responseCode ?? code ?? 'unknown'), permanent: (responseCode ?? 0) >= 500 };
}
