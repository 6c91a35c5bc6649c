import type { Browser, Page } from '@playwright/test';
import { expect, SETTLED, test } from '../setup/e2e';

test('a bill is written by keyboard: rows come and go at once, and the proofreader speaks beside its line', async ({
	page,
	signUp,
	barriers
}) => {
	await signUp();
	await openRoom(page);
	await beginProject(page, 'Pocket cards');

	await page.getByLabel('Role').fill('Card');
	await page.getByLabel('Paper', { exact: true }).selectOption({ label: 'Cardstock' });
	const first = page.getByRole('listitem', { name: /^Piece 1/ });
	await first.getByLabel('Name').fill('Base');
	await first.getByLabel('Width', { exact: true }).fill('8 1/2');
	await first.getByLabel('Height', { exact: true }).fill('5 1/2');
	await expect(first.getByRole('img')).toHaveAccessibleName(/^Base, 8 and 1 half inches wide/);

	await page.getByRole('button', { name: 'Add a piece' }).press('Enter');
	const second = page.getByRole('listitem', { name: /^Piece 2/ });
	await expect(second.getByLabel('Name')).toBeFocused();
	await second.getByLabel('Name').fill('Front');
	await second.getByLabel('Width', { exact: true }).fill('4');
	await second.getByLabel('Height', { exact: true }).fill('5');
	await page.getByRole('button', { name: 'Move Piece 2, Front up' }).press('Enter');
	await expect(page.getByRole('listitem', { name: 'Piece 1, Front' })).toBeVisible();
	await page.getByRole('button', { name: 'Take out Piece 1, Front' }).press('Enter');
	await expect(page.getByRole('listitem', { name: /^Piece 2/ })).toHaveCount(0);

	await page.getByRole('button', { name: 'List a trimmer among the tools' }).click();
	await expect(page.getByRole('listitem', { name: /^Tool 1/ })).toBeVisible();
	await expect(page.getByText('The proofreader has nothing to say.')).toBeVisible();
	expect(await barriers()).toEqual([]);

	await page.getByLabel('Name of the project').press('Enter');
	await page.waitForURL(/\?kept/);
	await expect(page.getByText('The bill is kept.')).toBeVisible();
	expect(await barriers()).toEqual([]);
});

test('a bill is written, refused with what was typed, and kept without a script', async ({
	page,
	browser,
	signUp
}) => {
	await signUp();
	await openRoom(page);
	const plain = await withoutScript(page, browser);
	await beginProject(plain, 'Plain cards');

	await plain.getByLabel('Role').fill('Card');
	const piece = plain.getByRole('listitem', { name: /^Piece 1/ });
	await piece.getByLabel('Width', { exact: true }).fill('7..3');
	await piece.getByLabel('Height', { exact: true }).fill('5 1/2');
	await plain.getByRole('button', { name: 'Add a piece' }).click();
	await expect(piece.getByLabel('Width', { exact: true })).toHaveValue('7..3');
	await plain.getByRole('button', { name: 'Take out Piece 2' }).click();
	await plain.getByRole('button', { name: 'Keep the bill' }).first().click();
	const width = piece.getByLabel('Width', { exact: true });
	await expect(width).toHaveValue('7..3');
	await expect(width).toHaveAccessibleDescription(/7\.\.3/);

	await width.fill('7 3/8');
	await plain.getByRole('button', { name: 'Keep the bill' }).first().click();
	await expect(plain).toHaveURL(/\?kept/);
	await expect(plain.getByRole('region', { name: 'Verdict' })).toContainText('Short');
	await plain.context().close();
});

test('two who edit one bill see both versions, and nothing is lost', async ({ page, signUp }) => {
	await signUp();
	await openRoom(page);
	await beginProject(page, 'Shared cards');
	await page.getByLabel('Role').fill('Card');
	await fillPiece(page, '6', '4');
	await page.getByRole('button', { name: 'Keep the bill' }).first().click();
	await page.waitForURL(/\?kept/);
	const bill = `${new URL(page.url()).pathname}/bill`;

	const other = await page.context().newPage();
	await other.goto(bill, SETTLED);
	await page.goto(bill, SETTLED);
	await fillPiece(other, '6 1/4', '4');
	await other.getByRole('button', { name: 'Keep the bill' }).first().click();
	await other.waitForURL(/\?kept/);

	await fillPiece(page, '6 1/2', '4');
	await page.getByRole('button', { name: 'Keep the bill' }).first().click();
	const both = page.getByRole('table', { name: 'What the two versions say differently' });
	await expect(both).toContainText('6 1/2');
	await expect(both).toContainText('6 1/4');
	await page.getByRole('button', { name: 'Keep mine instead' }).first().click();
	await page.waitForURL(/\?kept/);
	await expect(page.getByRole('table', { name: /^Pieces cut from/ })).toContainText('1⁄2');
});

test('a project goes to the trash and comes back whole', async ({ page, signUp }) => {
	await signUp();
	await openRoom(page);
	await page.goto('/projects', SETTLED);
	await page.getByRole('link', { name: 'Start from a starter' }).click();
	await page
		.getByRole('group', { name: 'Ours to start from' })
		.getByRole('radio')
		.first()
		.check({ force: true });
	await page.getByRole('button', { name: 'Add the project' }).click();
	await page.waitForURL(/\/projects\/[0-9a-f-]{36}$/);
	const name = await page.getByRole('heading', { level: 1 }).innerText();

	await page.getByRole('button', { name: 'Put this project in the trash' }).click();
	await page.waitForURL(/trashed=/);
	await expect(page.getByRole('table')).toHaveCount(0);
	await page.getByRole('button', { name: 'Undo' }).click();
	await expect(page.getByRole('table').getByRole('link', { name })).toBeVisible();
});

async function openRoom(page: Page): Promise<void> {
	await page.goto('/welcome', SETTLED);
	await page.getByLabel('What you call it').fill('Landing table');
	await page.getByRole('button', { name: 'Lay out my bench' }).click();
	await page.waitForURL((url) => url.pathname !== '/welcome');
}

async function beginProject(page: Page, name: string): Promise<void> {
	await page.goto('/projects/new', SETTLED);
	await page.getByLabel('Name', { exact: true }).fill(name);
	await page.getByRole('button', { name: 'Write the bill' }).click();
	await page.waitForURL(/\/bill$/);
	await page.waitForLoadState('networkidle');
}

async function fillPiece(page: Page, width: string, height: string): Promise<void> {
	const piece = page.getByRole('listitem', { name: /^Piece 1/ });
	await piece.getByLabel('Width', { exact: true }).fill(width);
	await piece.getByLabel('Height', { exact: true }).fill(height);
}

/** The same person in a browser that runs no scripts. */
async function withoutScript(page: Page, browser: Browser): Promise<Page> {
	const context = await browser.newContext({
		baseURL: process.env.E2E_ORIGIN,
		storageState: await page.context().storageState(),
		javaScriptEnabled: false
	});
	return context.newPage();
}
