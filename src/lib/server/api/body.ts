import { Unacceptable } from '../errors';

const MEGABYTE = 1024 * 1024;

/**
 * The JSON that a request carries, read no further than `limit` bytes.
 * @throws {Unacceptable} for another type, too much of it, or what isn't JSON
 */
export async function readJson(request: Request, limit: number): Promise<unknown> {
	const type = request.headers.get('content-type')?.split(';', 1)[0]?.trim().toLowerCase();
	if (type !== 'application/json') throw new Unacceptable(415, 'Send JSON, as application/json.');
	const text = await readText(request, limit);
	try {
		return JSON.parse(text);
	} catch {
		throw new Unacceptable(400, 'This isn’t JSON.');
	}
}

async function readText(request: Request, limit: number): Promise<string> {
	const tooLarge = new Unacceptable(413, `That is too much at once: at most ${limit / MEGABYTE} MB.`);
	if (Number(request.headers.get('content-length') ?? 0) > limit) throw tooLarge;
	const reader = request.body?.getReader();
	const chunks: Uint8Array[] = [];
	let size = 0;
	while (reader) {
		const { done, value } = await reader.read().catch((error: unknown) => {
			// The adapter's own limit, met while the body is still on its way.
			if ((error as { status?: number }).status === 413) throw tooLarge;
			throw error;
		});
		if (done) break;
		size += value.length;
		if (size > limit) {
			await reader.cancel();
			throw tooLarge;
		}
		chunks.push(value);
	}
	return Buffer.concat(chunks).toString('utf8');
}
