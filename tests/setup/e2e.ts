import { AxeBuilder } from '@axe-core/playwright';
import { test as base, expect, type Page } from '@playwright/test';
import { randomUUID } from 'node:crypto';
import { readdir, readFile } from 'node:fs/promises';
import { join } from 'node:path';
import type { StoredLetter } from '../fakes/mail-server';

export { expect };

/** A form is filled once the page has come alive, as a person would. */
export const SETTLED = { waitUntil: 'networkidle' } as const;

export interface Person {
	readonly name: string;
	readonly email: string;
	readonly password: string;
}

interface Journeys {
	/** A person of this test's own, not signed up yet. */
	person: Person;
	/** Signs the person up through the pages and her letter; ends where a newcomer lands. */
	signUp: (person?: Person) => Promise<Person>;
	login: (person: Person) => Promise<void>;
	/** The newest letter to somebody, once it has come. */
	mail: (to: string) => Promise<StoredLetter>;
	/** What an accessibility checker finds wrong on the page as it stands. */
	barriers: () => Promise<string[]>;
	quiet: void;
}

export const test = base.extend<Journeys>({
	baseURL: async ({}, use) => use(process.env.E2E_ORIGIN),

	person: async ({}, use) => {
		const email = `${randomUUID()}@makers.example`;
		await use({ name: 'Tansy Hollis', email, password: 'four sheets of oat card' });
	},

	signUp: async ({ page, person: own, mail }, use) =>
		use(async (person = own) => {
			await page.goto('/sign-up', SETTLED);
			await page.getByLabel('Your name').fill(person.name);
			await page.getByLabel('E-mail address').fill(person.email);
			await page.getByLabel('Password').fill(person.password);
			await page.getByRole('button', { name: 'Open the account' }).click();
			await expect(page.getByText('Look in your mail')).toBeVisible();
			await page.goto(linkIn(await mail(person.email)), SETTLED);
			await page.getByLabel('The password you chose').fill(person.password);
			await page.getByRole('button', { name: 'Confirm and come in' }).click();
			await page.waitForURL((url) => !url.pathname.startsWith('/sign-up'));
			return person;
		}),

	login: async ({ page }, use) =>
		use(async ({ email, password }) => {
			await page.goto('/sign-in', SETTLED);
			await page.getByLabel('E-mail address').first().fill(email);
			await page.getByLabel('Password').fill(password);
			await page.getByRole('button', { name: 'Sign in' }).click();
			await page.waitForURL((url) => !url.pathname.startsWith('/sign-in'));
		}),

	mail: async ({}, use) =>
		use(async (to) => {
			let newest: StoredLetter | undefined;
			await expect
				.poll(async () => (newest = (await lettersTo(to)).at(-1)), {
					message: `a letter to ${to}`,
					timeout: 15_000
				})
				.toBeTruthy();
			return newest!;
		}),

	barriers: async ({ page }, use) =>
		use(async () => {
			const { violations } = await new AxeBuilder({ page })
				.withTags(['wcag2a', 'wcag2aa', 'wcag21aa'])
				.analyze();
			return violations.flatMap(({ id, nodes }) => nodes.map(({ target }) => `${id}: ${target.join(' ')}`));
		}),

	/** Anything that a page complains of fails its test. */
	quiet: [
		async ({ page }, use) => {
			const complaints = listen(page);
			await use();
			expect(complaints, 'errors in the page or its console').toEqual([]);
		},
		{ auto: true }
	]
});

/** The address in a letter, which stands on a line of its own. */
export function linkIn({ text }: StoredLetter): string {
	const link = text.split('\n').find((line) => line.startsWith('http'));
	if (!link) throw new Error(`No link in the letter:\n${text}`);
	return link.trim();
}

function listen(page: Page): string[] {
	const complaints: string[] = [];
	page.on('pageerror', (error) => complaints.push(String(error)));
	page.on('console', (message) => {
		if (message.type() === 'error') complaints.push(`${message.text()} (${message.location().url})`);
	});
	return complaints;
}

async function lettersTo(to: string): Promise<StoredLetter[]> {
	const folder = join(process.env.E2E_FOLDER ?? '', 'mail');
	const names = (await readdir(folder)).filter((name) => !name.startsWith('.')).sort();
	const letters = await Promise.all(names.map((name) => readFile(join(folder, name), 'utf8')));
	return letters.map((text) => JSON.parse(text) as StoredLetter).filter((letter) => letter.to === to);
}
