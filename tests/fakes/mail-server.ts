import { mkdir, rename, writeFile } from 'node:fs/promises';
import type { AddressInfo } from 'node:net';
import { join } from 'node:path';
import { buffer } from 'node:stream/consumers';
import PostalMime from 'postal-mime';
import { SMTPServer } from 'smtp-server';

export interface StoredLetter {
	readonly from: string;
	readonly to: string;
	readonly subject: string;
	readonly text: string;
	readonly messageId: string;
	readonly receivedAt: string;
}

export interface FakeMail {
	readonly port: number;
	readonly close: () => Promise<void>;
}

/** A mail server that delivers nothing: each letter becomes a JSON file in `folder`, named in order of arrival. */
export async function startFakeMail(folder: string, port = 0): Promise<FakeMail> {
	await mkdir(folder, { recursive: true });
	let nth = 0;
	const server = new SMTPServer({
		disabledCommands: ['AUTH', 'STARTTLS'],
		onData(stream, session, done) {
			buffer(stream)
				.then((bytes) => PostalMime.parse(bytes))
				.then(async (mail) => {
					const receivedAt = new Date().toISOString();
					const letter: StoredLetter = {
						from: mail.from?.address ?? '',
						to: session.envelope.rcptTo.map(({ address }) => address).join(', '),
						subject: mail.subject ?? '',
						text: mail.text ?? '',
						messageId: mail.messageId ?? '',
						receivedAt
					};
					const name = `${receivedAt.replaceAll(':', '-')}-${String(nth++).padStart(6, '0')}.json`;
					// Written whole or not at all: a page may be reading the folder.
					await writeFile(join(folder, `.${name}`), JSON.stringify(letter, null, '\t'));
					await rename(join(folder, `.${name}`), join(folder, name));
					done();
				})
				.catch(done);
		}
	});
	await new Promise<void>((resolve, reject) => {
		server.once('error', reject);
		server.listen(port, '127.0.0.1', () => resolve());
	});
	return {
		port: (server.server.address() as AddressInfo).port,
		close: () => new Promise((resolve) => server.close(() => resolve()))
	};
}
