import type { Page } from '@playwright/test';
import { expect, SETTLED, test } from '../setup/e2e';

test('a visitor sees the idea, and lifts another flap by keyboard', async ({ page, barriers }) => {
	await page.goto('/', SETTLED);
	await expect(page.getByRole('heading', { level: 1 })).toContainText('make tonight');
	await expect(
		page.getByRole('img', { name: /^Fern Lattice, 12 inches by 12 inches/ }).first()
	).toBeVisible();

	const pocket = page.getByRole('link', { name: 'Pocket with three tags' });
	await expect(pocket).toHaveAttribute('aria-expanded', 'false');
	await pocket.press('Enter');
	await expect(pocket).toHaveAttribute('aria-expanded', 'true');
	await expect(pocket).toBeFocused();
	await expect(page.getByRole('heading', { name: 'What is missing' })).toBeVisible();
	expect(await barriers()).toEqual([]);
});

test('a starter project is tried with papers of one’s own: now, then short of a sheet', async ({
	page,
	barriers
}) => {
	await page.goto('/try?project=note-cards', SETTLED);
	await fillPaper(page, 'First', '8 1/2 x 11', 2);
	await page.getByRole('button', { name: 'Can I make it?' }).click();
	const answer = page.getByRole('region', { name: 'The answer' });
	await expect(answer).toContainText('Make it now');
	await expect(answer.getByRole('img', { name: /^Your second paper/ }).first()).toBeVisible();
	expect(await barriers()).toEqual([]);

	await fillPaper(page, 'First', '8 1/2 x 11', 1);
	await page.getByRole('button', { name: 'Can I make it?' }).click();
	await expect(answer).toContainText('Short');
	await expect(answer).toContainText('1 more sheet of 8 1⁄2 × 11 in');
	await expect(answer).toContainText('What can be cut already');
});

test('the try works without a script, and keeps what was typed', async ({ browser, baseURL }) => {
	const context = await browser.newContext({ javaScriptEnabled: false, baseURL });
	const page = await context.newPage();
	await page.goto('/try');
	await page.getByRole('radio', { name: /Lidded gift box/ }).check({ force: true });
	await fillPaper(page, 'First', '12 x', 2);
	await page.getByRole('button', { name: 'Can I make it?' }).click();
	const size = page.getByRole('group', { name: 'First paper' }).getByLabel('Size of a sheet');
	await expect(size).toHaveValue('12 x');
	await expect(size).toHaveAttribute('aria-invalid', 'true');

	await size.fill('8 1/2 x 11');
	await page.getByRole('button', { name: 'Can I make it?' }).click();
	await expect(page.getByRole('region', { name: 'The answer' })).toContainText('Make it now');
	await context.close();
});

test('a theme is worn at once, and from the first paint of the next page', async ({ page }) => {
	await page.goto('/', SETTLED);
	const kept = page.waitForResponse((response) => response.url().endsWith('/theme'));
	await page.getByRole('radio', { name: 'Dark' }).check({ force: true });
	await expect(page.locator('html')).toHaveAttribute('data-theme', 'dark');
	await kept;
	const html = await (await page.request.get('/try')).text();
	expect(html).toContain('data-theme="dark"');
});

async function fillPaper(page: Page, which: 'First' | 'Second' | 'Third', size: string, sheets: number) {
	const paper = page.getByRole('group', { name: `${which} paper` });
	await paper.getByLabel('Size of a sheet').fill(size);
	await paper.getByLabel('Sheets', { exact: true }).fill(String(sheets));
}
