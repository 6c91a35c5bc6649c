import type { BillDraft } from '$lib/schemas/bill-draft';
import type { CheckedDraft } from '$lib/schemas/bill-check';
import { editRows } from '$lib/schemas/bill-rows';
import type { Option } from '$lib/components/ui/options';
import type { Units } from '$lib/components/ui/units';
import { createContext, tick } from 'svelte';
import { SvelteSet } from 'svelte/reactivity';

/** What is told of a draft: refused fields, the proofreader's findings, and what can be drawn. */
export type Told = Omit<CheckedDraft, 'document'>;

/** A pause in typing that is long enough to read the whole bill again. */
const PAUSE_MS = 150;

/** The bill on the page: every change is made on the draft at once, and told of after a pause. */
export class BillEditor {
	draft: BillDraft = $state()!;
	told: Told = $state.raw()!;
	/** Said to a screen reader after a row came or went. */
	says = $state('');
	changed = $state(false);
	private readonly left = new SvelteSet<string>();
	private telling: ReturnType<typeof setTimeout> | undefined;

	constructor(
		draft: BillDraft,
		told: Told,
		private readonly roomUnits: Units,
		/** Every refusal shows, also of fields that nobody has left yet. */
		private strict: boolean,
		/** Where a form without a script goes on: its disclosure stands open. */
		private readonly focus: string | null
	) {
		this.draft = draft;
		this.told = told;
	}

	get units(): Units {
		return (this.draft.units || this.roomUnits) as Units;
	}

	issue(path: string): string | undefined {
		return this.strict || this.left.has(path) ? this.told.issues[path] : undefined;
	}

	/** Whether something in these parts of a line is refused, or was just added without a script. */
	calls(path: string, parts: readonly string[]): boolean {
		const within = (field: string) => parts.some((part) => `${field}.`.startsWith(`${path}.${part}.`));
		if (this.focus !== null && within(this.focus)) return true;
		return Object.keys(this.told.issues).some((field) => within(field) && this.issue(field) !== undefined);
	}

	findings(line: string) {
		return this.told.findings.filter((finding) => finding.line === line);
	}

	/** Lines to choose from, by the name they have so far. */
	options(list: 'slots' | 'pieces' | 'adhesives' | 'tools', except?: string): Option[] {
		return this.draft[list]
			.filter(({ key }) => key !== except)
			.map(({ key, name }) => ({ value: key, label: name.trim() || key }));
	}

	refuse(told: Told): void {
		this.told = told;
		this.strict = true;
	}

	leave(path: string): void {
		if (path) this.left.add(path);
	}

	touch(): void {
		this.changed = true;
		clearTimeout(this.telling);
		this.telling = setTimeout(() => void this.tell(), PAUSE_MS);
	}

	/** Does at once what the server would do with a row's button, and goes on where it leads. */
	async press(asked: string, form: HTMLFormElement): Promise<void> {
		const done = editRows(this.draft, asked);
		if (!done) return;
		this.says = done.says;
		this.touch();
		await tick();
		const verb = asked.split(' ')[0] ?? '';
		const button = (value: string) => form.querySelector<HTMLElement>(`button[value="${value}"]:enabled`);
		const moved = verb === 'up' || verb === 'down' ? button(`${verb} ${done.path}`) : null;
		(moved ?? firstField(form, done.path) ?? button(`add ${done.path}`))?.focus();
	}

	/** The schemas come when somebody types, so that the page itself stays light. */
	private async tell(): Promise<void> {
		const { checkDraft } = await import('$lib/schemas/bill-check');
		this.told = checkDraft($state.snapshot(this.draft), this.roomUnits);
	}
}

function firstField(form: HTMLFormElement, path: string): HTMLElement | null {
	return form.querySelector<HTMLElement>(
		`:is([name^="${path}."], [name="${path}"]):not([type="hidden"]):not([type="checkbox"])`
	);
}

export const [getEditor, setEditor] = createContext<BillEditor>();
