import { readdir, readFile } from 'node:fs/promises';
import { join } from 'node:path';
import { z } from 'zod';

const letter = z.object({
	to: z.string(),
	subject: z.string(),
	text: z.string(),
	messageId: z.string(),
	receivedAt: z.string()
});
export type FakeLetter = z.infer<typeof letter>;

/** What the demonstration's mail server has taken, the newest first. */
export async function readFakeMail(dataDir: string, most = 50): Promise<FakeLetter[]> {
	const folder = join(dataDir, 'mail');
	const files = await readdir(folder).catch(() => []);
	const newest = files
		.filter((name) => name.endsWith('.json'))
		.sort()
		.reverse()
		.slice(0, most);
	return Promise.all(
		newest.map(async (name) => letter.parse(JSON.parse(await readFile(join(folder, name), 'utf8'))))
	);
}
