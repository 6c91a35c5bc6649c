import type { Page } from '@playwright/test';
import { expect, SETTLED, test } from '../setup/e2e';

const PAPER = 'Hedgebell Rows';

test('from an empty room to cut paper: short, then now, then a cut plan carried out', async ({
	page,
	signUp,
	barriers
}) => {
	const verdict = page.getByRole('region', { name: 'Verdict' });
	await signUp();
	await test.step('make the room', () => setUpRoom(page, 'Back bedroom'));
	await test.step('add a pad and a tape', async () => {
		await addPad(page, { name: 'Tuffet Lane', size: '12 x 12', sheets: 4, designs: [PAPER, 'Oat Ripple'] });
		await addTape(page, { name: 'Narrow tape', width: '1/4 in', left: '40 in' });
	});
	await test.step('write a bill of three lines', () => writeBill(page, 'Travel folio'));
	const project = new URL(page.url()).pathname;

	await test.step('see that it is short, and of what', async () => {
		await expect(verdict).toContainText('Short');
		await expect(page.getByRole('main')).toContainText(/53 in more/);
	});
	await test.step('add what is missing and see that it can be made', async () => {
		await addTape(page, { name: 'Second narrow tape', width: '1/4 in', left: '98 in' });
		await page.goto(project, SETTLED);
		await expect(verdict).toContainText('Make it now');
	});
	await test.step('print the plan', async () => {
		await page.getByRole('link', { name: 'Cut plan' }).click();
		await expect(page.getByRole('button', { name: 'Cut this' })).toBeVisible();
		expect(await barriers()).toEqual([]);
		await page.emulateMedia({ media: 'print' });
		await expect(page.getByRole('heading', { level: 1 })).toContainText('Travel folio');
		await expect(page.getByText(PAPER).first()).toBeVisible();
		await expect(page.getByRole('button', { name: 'Cut this' })).toBeHidden();
		await expect(page.getByRole('link', { name: 'Stash' })).toBeHidden();
		await page.emulateMedia({ media: 'screen' });
	});
	await test.step('cut it: the stash goes down and an offcut appears', async () => {
		expect(await stashOf(page)).toEqual([[PAPER, '2 sheets']]);
		await page.goto(`${project}/plan`, SETTLED);
		await page.getByRole('button', { name: 'Cut this' }).click();
		await page.waitForURL(/did=|\/plan$/);
		await expect(page.getByRole('button', { name: 'Undo' }).first()).toBeVisible();
		const left = await stashOf(page);
		expect(left).toContainEqual([PAPER, '1 sheet']);
		expect(left.length).toBeGreaterThan(1);
	});
});

async function setUpRoom(page: Page, name: string): Promise<void> {
	await page.goto('/welcome', SETTLED);
	await page.getByLabel('What you call it').fill(name);
	await page.getByRole('radio', { name: /Inches/ }).check({ force: true });
	await page.getByLabel('The longest cut it makes').fill('12 1/4');
	await page.getByLabel('Trimmer', { exact: true }).check({ force: true });
	await page.getByRole('button', { name: 'Lay out my bench' }).click();
	await page.waitForURL((url) => url.pathname !== '/welcome');
}

async function addPad(
	page: Page,
	pad: { name: string; size: string; sheets: number; designs: string[] }
): Promise<void> {
	await page.goto('/supplies/pad', SETTLED);
	await page.getByLabel('What the pad is called').fill(pad.name);
	await page.getByLabel('Size of a sheet').fill(pad.size);
	await page.getByLabel('Sheets in the pad').fill(String(pad.sheets));
	await page.getByLabel('Designs', { exact: true }).fill(String(pad.designs.length));
	await page.getByLabel('Names of the designs').fill(pad.designs.join('\n'));
	await page.getByRole('button', { name: 'Put it in the stash' }).click();
	await page.waitForURL((url) => url.pathname === '/supplies');
}

async function addTape(page: Page, tape: { name: string; width: string; left: string }): Promise<void> {
	await page.goto('/supplies/new?kind=tape', SETTLED);
	await page.getByLabel('Name', { exact: true }).fill(tape.name);
	await page.getByLabel('Width').fill(tape.width);
	await page.getByLabel('Length left').fill(tape.left);
	await page.getByRole('button', { name: 'Save it' }).click();
	await page.waitForURL((url) => url.pathname !== '/supplies/new');
}

/** A paper, one piece of it, and the tape for its rim. */
async function writeBill(page: Page, name: string): Promise<void> {
	await page.goto('/projects/new', SETTLED);
	await page.getByLabel('Name', { exact: true }).fill(name);
	await page.getByRole('button', { name: 'Write the bill' }).click();
	await page.waitForURL(/\/bill$/);

	const row = async (add: string, named: RegExp) => {
		const line = page.getByRole('listitem', { name: named });
		if ((await line.count()) === 0) await page.getByRole('button', { name: add }).click();
		await expect(line).toBeVisible();
		return line;
	};
	const slot = await row('Add a slot', /^Slot 1/);
	await slot.getByLabel('Role').fill('Cover');
	await slot.getByLabel('Paper', { exact: true }).selectOption({ label: 'Patterned paper' });
	const piece = await row('Add a piece', /^Piece 1/);
	await piece.getByLabel('Name').fill('Cover');
	await piece.getByLabel('From slot').selectOption({ index: 1 });
	await piece.getByLabel('Width', { exact: true }).fill('11');
	await piece.getByLabel('Height', { exact: true }).fill('7');
	await piece.getByLabel('How many').fill('1');
	const tape = await row('Add an adhesive', /^Adhesive 1/);
	await tape.getByLabel('Kind').selectOption({ label: 'Tape' });
	await tape.getByLabel('How much').fill('93 in');
	await tape.getByLabel('Width', { exact: true }).fill('1/4 in');
	await page.getByRole('button', { name: 'Keep the bill' }).last().click();
	await page.waitForURL(/\/projects\/[0-9a-f-]+(\?.*)?$/);
}

/** What the stash has of the paper: each row's name and what is left of it. */
async function stashOf(page: Page): Promise<string[][]> {
	await page.goto(`/supplies?q=${encodeURIComponent(PAPER)}`, SETTLED);
	const rows = page.getByRole('table').getByRole('row').filter({ hasText: PAPER });
	return Promise.all(
		(await rows.all()).map(async (row) => [
			await row.getByRole('link').first().innerText(),
			(/\d+ sheets?/.exec(await row.innerText()) ?? [''])[0]
		])
	);
}
