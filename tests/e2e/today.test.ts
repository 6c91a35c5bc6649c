import type { Page } from '@playwright/test';
import { expect, SETTLED, test } from '../setup/e2e';

test('an empty room says its one next step', async ({ page, signUp, barriers }) => {
	await signUp();
	await setUp(page, {});
	await page.goto('/today', SETTLED);
	await expect(page.getByText('The stash is empty')).toBeVisible();
	await expect(page.getByRole('main').getByRole('link', { name: 'Add a paper' })).toHaveAttribute(
		'href',
		'/supplies/new'
	);
	expect(await barriers()).toEqual([]);
});

test('projects lie as flaps with their verdict; lifted by keyboard, one says what is missing and what can be cut', async ({
	page,
	signUp,
	barriers
}) => {
	await signUp();
	await setUp(page, { 'Cardstock, page size': 3 });
	await addStarter(page, 'Four note cards');
	await page.goto('/today', SETTLED);

	const flap = page
		.getByRole('listitem')
		.filter({ has: page.getByRole('link', { name: 'Four note cards' }) });
	await expect(flap).toContainText('Short');
	const lift = flap.getByRole('link', { name: 'Four note cards' });
	await lift.press('Enter');
	await expect(lift).toHaveAttribute('aria-expanded', 'true');
	await expect(lift).toBeFocused();
	await expect(flap).toContainText('What is missing');
	await expect(flap).toContainText(/more sheets? of 12 × 12 in/);
	await expect(flap.getByRole('img', { name: /^Cardstock, page size/ }).first()).toBeVisible();
	expect(await barriers()).toEqual([]);

	await page.reload(SETTLED);
	await expect(flap).toContainText('What can be cut already');
	await lift.press('Enter');
	await expect(flap).not.toContainText('What is missing');
});

test('the order is changed, said, and undone', async ({ page, signUp }) => {
	await signUp();
	await setUp(page, { 'Cardstock, page size': 3 });
	await addStarter(page, 'Four note cards');
	await addStarter(page, 'Lidded gift box');
	await page.goto('/today', SETTLED);
	await page.getByRole('link', { name: 'In order' }).click();
	const names = page.getByRole('main').getByRole('heading', { level: 2 });
	await expect(names).toHaveText(['Four note cards', 'Lidded gift box']);

	await page.getByRole('button', { name: 'Move Lidded gift box up' }).click();
	await expect(names).toHaveText(['Lidded gift box', 'Four note cards']);
	await page.getByRole('button', { name: 'Undo' }).click();
	await expect(names).toHaveText(['Four note cards', 'Lidded gift box']);
});

async function setUp(page: Page, sheets: Readonly<Record<string, number>>): Promise<void> {
	await page.goto('/welcome', SETTLED);
	await page.getByLabel('What you call it').fill('Box room');
	for (const [paper, count] of Object.entries(sheets)) await page.getByLabel(paper).fill(String(count));
	await page.getByRole('button', { name: 'Lay out my bench' }).click();
	await page.waitForURL((url) => url.pathname !== '/welcome');
}

async function addStarter(page: Page, name: string): Promise<void> {
	await page.goto('/projects/new?from=starter', SETTLED);
	await page.getByRole('radio', { name: new RegExp(name) }).check({ force: true });
	await page.getByRole('button', { name: 'Add the project' }).click();
	await page.waitForURL(/\/projects\/[0-9a-f-]{36}/);
}
