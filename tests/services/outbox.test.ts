import { mkdtempSync, readdirSync, readFileSync, rmSync } from 'node:fs';
import type { AddressInfo } from 'node:net';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { SMTPServer } from 'smtp-server';
import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest';
import type { Database } from '../../src/lib/server/db/client';
import { outbox } from '../../src/lib/server/db/schema/outbox';
import { log } from '../../src/lib/server/log';
import { startSender } from '../../src/lib/server/mail/sender';
import { markFailed, oweLetter, takeLetter, type OwedLetter } from '../../src/lib/server/services/outbox';
import { emptyDatabase } from '../factories/room';
import { startFakeMail, type StoredLetter } from '../fakes/mail-server';

log.level = 'silent';
const letter = {
	to: 'fern@paperlarder.test',
	subject: 'Über ⅛ in',
	body: 'First line\n\nhttps://x.test/a=b\n'
};

let db: Database;
const undo: (() => unknown)[] = [];
beforeEach(async () => {
	db = await emptyDatabase();
});
afterEach(async () => {
	for (const step of undo.splice(0).reverse()) await step();
});

const owe = () => db.write((tx) => oweLetter(tx, letter));
const rows = () => db.reader.select().from(outbox);
const send = (port: number) =>
	undo.push(
		startSender(db, { smtpUrl: `smtp://127.0.0.1:${port}`, from: 'Paperlarder <p@paperlarder.test>' })
	);

async function answering(code: number): Promise<number> {
	const server = new SMTPServer({
		disabledCommands: ['AUTH', 'STARTTLS'],
		onRcptTo: (_address, _session, done) => done(Object.assign(new Error('no'), { responseCode: code }))
	});
	server.on('error', () => {});
	await new Promise<void>((resolve) => server.listen(0, '127.0.0.1', () => resolve()));
	undo.push(() => new Promise<void>((resolve) => server.close(() => resolve())));
	return (server.server.address() as AddressInfo).port;
}

describe('a letter that is owed', () => {
	it('arrives as it was written, and its text is kept no longer', async () => {
		const folder = mkdtempSync(join(tmpdir(), 'paperlarder-mail-'));
		undo.push(() => rmSync(folder, { recursive: true }));
		const mail = await startFakeMail(folder);
		undo.push(mail.close);
		await owe();
		const [owed] = await rows();
		send(mail.port);
		await vi.waitFor(async () => expect((await rows())[0]?.sentAt).not.toBeNull(), 10_000);
		const stored = readdirSync(folder).filter((name) => name.endsWith('.json'));
		expect(stored).toHaveLength(1);
		const { to, subject, text, messageId } = JSON.parse(
			readFileSync(join(folder, stored[0] ?? ''), 'utf8')
		) as StoredLetter;
		expect({ to, subject, body: text.replaceAll('\r\n', '\n') }).toEqual(letter);
		expect(messageId).toBe(owed?.messageId);
		expect((await rows())[0]).toMatchObject({ body: '', tries: 1, nextTryAt: null, deadAt: null });
	});

	it('isn’t owed where what caused it comes to nothing', async () => {
		const failing = db.write(async (tx) => {
			await oweLetter(tx, letter);
			throw new Error('the rest failed');
		});
		await expect(failing).rejects.toThrow('the rest failed');
		expect(await rows()).toEqual([]);
	});

	it('waits where the server says later, under the same Message-ID', async () => {
		await owe();
		const [owed] = await rows();
		send(await answering(451));
		await vi.waitFor(async () => expect((await rows())[0]?.lastError).toBe('451'), 10_000);
		const [waiting] = await rows();
		expect(waiting).toMatchObject({ body: letter.body, messageId: owed?.messageId, deadAt: null });
		expect(waiting?.nextTryAt).toBeGreaterThan(Date.now());
	});

	it('waits where nobody answers', async () => {
		await owe();
		send(1);
		await vi.waitFor(async () => expect((await rows())[0]?.lastError).toBe('ESOCKET'), 10_000);
		expect((await rows())[0]).toMatchObject({ deadAt: null, body: letter.body });
	});

	it('is a dead letter where the server says never', async () => {
		await owe();
		send(await answering(550));
		await vi.waitFor(async () => expect((await rows())[0]?.deadAt).not.toBeNull(), 10_000);
		expect((await rows())[0]).toMatchObject({ lastError: '550', nextTryAt: null, sentAt: null });
	});
});

describe('trying again', () => {
	it('waits longer each time, and gives up after twelve', async () => {
		await owe();
		const waits: number[] = [];
		for (let time = 1; time <= 12; time++) {
			await db.write((tx) => tx.update(outbox).set({ nextTryAt: 0 }));
			const taken = (await db.write(takeLetter)) as OwedLetter;
			const before = Date.now();
			const { dead } = await db.write((tx) => markFailed(tx, taken, { code: '451', permanent: false }));
			expect(dead).toBe(time === 12);
			if (!dead) waits.push(((await rows())[0]?.nextTryAt ?? 0) - before);
		}
		expect(waits).toEqual([...waits].sort((a, b) => a - b));
		expect(waits[0]).toBeGreaterThanOrEqual(5_000);
		expect(await db.write(takeLetter)).toBeUndefined();
	});

	it('gives a letter to one sender at a time', async () => {
		await owe();
		const taken = await Promise.all([db.write(takeLetter), db.write(takeLetter), db.write(takeLetter)]);
		expect(taken.filter(Boolean)).toHaveLength(1);
	});
});
