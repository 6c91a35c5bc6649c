import type { Browser, Page } from '@playwright/test';
import { expect, SETTLED, test } from '../setup/e2e';

test('a pad, an offcut and a tape go into the stash, are found again, moved, thrown away and had back', async ({
	page,
	signUp,
	barriers
}) => {
	await signUp();
	await makeRoom(page);
	await test.step('an empty stash says the one next step', async () => {
		await page.goto('/supplies', SETTLED);
		expect(await barriers()).toEqual([]);
		await page.getByRole('link', { name: 'Enter your first pad' }).click();
		await page.waitForURL('**/supplies/pad');
	});
	await test.step('a pad becomes a row for each design, shown before it is kept', async () => {
		await page.getByLabel('What the pad is called').fill('Hedge School');
		await page.getByLabel('Names of the designs').fill('Acorn Spot\n\nBramble Rows');
		await expect(page.getByRole('listitem').filter({ hasText: 'Design 12' })).toBeVisible();
		await expect(page.getByText('2 sheets each')).toBeVisible();
		expect(await barriers()).toEqual([]);
		await page.getByRole('button', { name: 'Put it in the stash' }).click();
		await page.waitForURL(/\/supplies\?collection=/);
		await expect(page.getByText('12 rows are in the stash.')).toBeVisible();
		await expect(page.getByRole('row', { name: /Acorn Spot/ })).toContainText('2 sheets');
		await expect(page.getByRole('row', { name: /Design 02\b/ })).toBeVisible();
	});
	await test.step('a refused size is said beside its field, and what was typed stays', async () => {
		await page.goto('/supplies/new', SETTLED);
		expect(await barriers()).toEqual([]);
		await page.getByRole('link', { name: 'Cardstock' }).click();
		await page.getByLabel('Name', { exact: true }).fill('Oat');
		await page.getByLabel('Size of a sheet').fill('12 x 0.33 in');
		await page.getByRole('button', { name: 'Save it' }).click();
		await expect(page.getByLabel('Size of a sheet')).toBeFocused();
		await expect(page.getByLabel('Size of a sheet')).toHaveValue('12 x 0.33 in');
		await expect(page.getByLabel('Size of a sheet')).toHaveAttribute('aria-invalid', 'true');
		await page.getByLabel('Size of a sheet').fill('4 1/4 x 5 1/2');
		await page.getByLabel('It’s an offcut').check();
		await page.getByRole('button', { name: 'Save and add another' }).click();
		await page.waitForURL(/like=/);
		await expect(page.getByText('Oat is in the stash.')).toBeVisible();
		await expect(page.getByLabel('Name', { exact: true })).toHaveValue('');
	});
	await test.step('words with a slip in them, and a size left, find it', async () => {
		await page.goto('/supplies', SETTLED);
		await page.getByLabel('Look for').fill('bramle');
		await expect(page.getByRole('status').filter({ hasText: '1 of 13 rows' })).toBeVisible();
		await expect(page.getByLabel('Look for')).toBeFocused();
		expect(new URL(page.url()).searchParams.get('q')).toBe('bramle');
		await page.reload(SETTLED);
		await expect(page.getByRole('row', { name: /Bramble Rows/ })).toBeVisible();
		await page.goto('/supplies?size=5+1/2+x+4+1/4&offcut=1', SETTLED);
		await expect(page.getByRole('row', { name: /Oat/ })).toBeVisible();
		await expect(page.getByRole('status').filter({ hasText: '1 of 13 rows' })).toBeVisible();
		expect(await barriers()).toEqual([]);
	});
	await test.step('chosen rows go to a new bin, and come out of it again', async () => {
		await page.goto('/supplies', SETTLED);
		await page.getByLabel('Choose Acorn Spot').check();
		await page.getByLabel('Choose Bramble Rows').check();
		await page.getByLabel('Move to').selectOption('+');
		await page.getByLabel('Name of the new bin').fill('Pad box');
		await page.getByRole('button', { name: 'Move', exact: true }).click();
		await expect(page.getByText('2 rows have been moved.')).toBeVisible();
		await expect(page.getByRole('row', { name: /Acorn Spot/ })).toContainText('Pad box');
		await page.getByRole('button', { name: 'Undo' }).focus();
		await page.keyboard.press('Enter');
		await expect(page.getByRole('row', { name: /Acorn Spot/ })).not.toContainText('Pad box');
		await expect(page.getByText('Put back as it was.')).toBeVisible();
	});
	await test.step('every row of the page is thrown away and had back', async () => {
		await page.goto('/supplies?view=pictures', SETTLED);
		expect(await barriers()).toEqual([]);
		await page.goto('/supplies', SETTLED);
		await page.getByLabel('Choose every row on this page').check();
		await page.getByRole('button', { name: 'Throw away' }).click();
		await expect(page.getByText('Nothing in the stash yet')).toBeVisible();
		await page.getByRole('button', { name: 'Undo' }).click();
		await expect(page.getByText('13 rows')).toBeVisible();
	});
	await test.step('one is counted again, used and its use undone', async () => {
		await page.getByLabel('Choose Acorn Spot').check();
		await page.getByRole('button', { name: 'Count again' }).click();
		await page.waitForURL(/\/supplies\/recount/);
		await page.getByLabel('Acorn Spot, left').fill('7');
		await page.getByRole('button', { name: 'Keep these counts' }).click();
		await page.waitForURL(/\/supplies(\?did=.*)?$/);
		await page.getByRole('link', { name: 'Acorn Spot' }).click();
		await expect(page.getByRole('heading', { level: 1, name: 'Acorn Spot' })).toBeVisible();
		await page.getByLabel('How much').fill('99');
		await page.getByRole('button', { name: 'Write it down' }).click();
		await expect(
			page.getByText('There isn’t that much').or(page.getByText("There isn't that much"))
		).toBeVisible();
		await page.getByLabel('How much').fill('3');
		await page.getByRole('button', { name: 'Write it down' }).click();
		await expect(page.getByText('Acorn Spot: noted in the ledger.')).toBeVisible();
		await expect(page.getByText('4 sheets')).toBeVisible();
		expect(await barriers()).toEqual([]);
		await page.getByRole('row', { name: /^Used/ }).getByRole('button', { name: 'Undo' }).click();
		await expect(page.getByText('7 sheets')).toBeVisible();
		await expect(page.getByRole('row', { name: /^Undid: used/ })).toContainText('+3');
	});
});

test('two people edit one row: the second sees both versions and decides', async ({
	page,
	signUp,
	context
}) => {
	await signUp();
	await makeRoom(page);
	await addCardstock(page, 'Oat');
	const address = new URL(page.url()).pathname;
	const other = await context.newPage();
	await page.goto(`${address}/edit`, SETTLED);
	await other.goto(`${address}/edit`, SETTLED);
	await other.getByLabel('Name', { exact: true }).fill('Oatmeal');
	await other.getByRole('button', { name: 'Keep the changes' }).click();
	await other.waitForURL((url) => url.pathname === address);
	await other.close();

	await page.getByLabel('Name', { exact: true }).fill('Oat flake');
	await page.getByRole('button', { name: 'Keep the changes' }).click();
	const both = page.getByRole('table', { name: 'Both versions' });
	await expect(both.getByRole('row', { name: /^Name/ })).toContainText('Oat flake');
	await expect(both.getByRole('row', { name: /^Name/ })).toContainText('Oatmeal');
	await page.getByRole('button', { name: 'Keep mine over it' }).click();
	await page.waitForURL((url) => url.pathname === address);
	await expect(page.getByRole('heading', { level: 1, name: 'Oat flake' })).toBeVisible();
});

test('without a script the stash is searched, added to, moved and undone by plain forms', async ({
	page,
	signUp,
	browser,
	context
}) => {
	await signUp();
	await makeRoom(page);
	await addCardstock(page, 'Oat');
	const plain = await withoutScript(browser, await context.storageState());
	await plain.goto('/supplies/new?kind=tape');
	await plain.getByLabel('Name', { exact: true }).fill('Narrow tape');
	await plain.getByLabel('Width').fill('1/4 in');
	await plain.getByLabel('Length left').fill('12 yd');
	await plain.getByLabel('Bin, box or drawer').fill('Tape tin');
	await plain.getByRole('button', { name: 'Save it' }).click();
	await expect(plain.getByRole('heading', { level: 1, name: 'Narrow tape' })).toBeVisible();

	await plain.goto('/supplies');
	await plain.getByLabel('Look for').fill('oatt');
	await plain.getByRole('button', { name: 'Look', exact: true }).click();
	await expect(plain.getByRole('row', { name: /Oat/ })).toBeVisible();
	await expect(plain.getByRole('row', { name: /Narrow tape/ })).toHaveCount(0);
	await plain.getByLabel('Choose Oat').check();
	await plain.getByRole('button', { name: 'Throw away' }).click();
	await expect(plain.getByText('Oat is in the trash.')).toBeVisible();
	expect(new URL(plain.url()).searchParams.get('q')).toBe('oatt');
	await plain.getByRole('button', { name: 'Undo' }).click();
	await expect(plain.getByRole('row', { name: /Oat/ })).toBeVisible();
	await plain.context().close();
});

async function makeRoom(page: Page): Promise<void> {
	await page.goto('/room/new', SETTLED);
	await page.getByLabel('What is it called?').fill('Back bedroom');
	await page.getByRole('button', { name: 'Make the room' }).click();
	await page.waitForURL((url) => url.pathname !== '/room/new');
}

/** Ends on the new row's own page. */
async function addCardstock(page: Page, name: string): Promise<void> {
	await page.goto('/supplies/new?kind=cardstock', SETTLED);
	await page.getByLabel('Name', { exact: true }).fill(name);
	await page.getByLabel('Size of a sheet').fill('12 x 12');
	await page.getByRole('button', { name: 'Save it' }).click();
	await page.waitForURL((url) => /^\/supplies\/[0-9a-f-]{36}$/.test(url.pathname));
}

async function withoutScript(
	browser: Browser,
	storageState: Awaited<ReturnType<ReturnType<Page['context']>['storageState']>>
): Promise<Page> {
	const context = await browser.newContext({
		javaScriptEnabled: false,
		storageState,
		baseURL: process.env.E2E_ORIGIN
	});
	return context.newPage();
}
