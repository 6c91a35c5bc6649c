import type { SupplyForm } from '$lib/schemas/supply-form';
import type { SupplyKind } from '$lib/domain/stash';
import type { SuperForm } from 'sveltekit-superforms';

export type SupplySuperForm = SuperForm<SupplyForm, SupplyMessage>;
/** Somebody else's version of the row, where an edit lost to it. */
export interface SupplyMessage {
	readonly text: string;
	readonly current?: SupplyForm;
}

/** What the form needs to know of the room. */
export interface RoomWords {
	readonly bins: readonly string[];
	readonly collections: readonly string[];
}

type ToolField = 'reach' | 'grooves' | 'shape' | 'toolSize' | 'cuts';

const TOOL_FIELDS: Readonly<Record<ToolField, readonly SupplyKind[]>> = {
	reach: [
		...(['trimmer', 'guillotine-cutter', 'rotary-cutter', 'ruler', 'cutting-mat', 'scoring-board'] as const),
		...(['corner-punch', 'edge-punch', 'hole-punch', 'die-cutter', 'eyelet-setter', 'stapler'] as const)
	],
	grooves: ['scoring-board'],
	shape: ['corner-punch', 'edge-punch', 'shape-punch', 'hole-punch', 'tab-punch', 'die', 'stamp'],
	toolSize: [
		...(['corner-punch', 'edge-punch', 'shape-punch', 'hole-punch', 'tab-punch'] as const),
		...(['die', 'embossing-folder', 'stamp', 'eyelet-setter', 'brush'] as const)
	],
	cuts: ['trimmer', 'guillotine-cutter', 'rotary-cutter', 'craft-knife', 'scissors', 'die-cutter']
};

/** Whether a kind of tool has the property at all. */
export const toolHas = (kind: SupplyKind, field: ToolField) => TOOL_FIELDS[field].includes(kind);

/** Fields as they are called on the form, for putting two versions side by side. */
export const FIELD_WORDS: readonly (readonly [keyof SupplyForm, string])[] = [
	['kind', 'Kind'],
	['name', 'Name'],
	['size', 'Size'],
	['sheets', 'Sheets'],
	['left', 'Left'],
	['full', 'When full'],
	['width', 'Width'],
	['unsure', 'Unsure of the count'],
	['collection', 'Collection'],
	['bin', 'Bin'],
	['faceA', 'Design on the front'],
	['directionA', 'Its direction'],
	['faceB', 'Design on the B-side'],
	['directionB', 'Its direction on the B-side'],
	['weight', 'Weight'],
	['caliper', 'Thickness'],
	['colours', 'Colours'],
	['offcut', 'Offcut'],
	['stripEdge', 'Branding strip'],
	['stripDepth', 'Depth of the strip'],
	['reach', 'Reach'],
	['grooves', 'Grooves every'],
	['shape', 'Shape'],
	['toolSize', 'Size'],
	['cutsPaper', 'Cuts paper'],
	['cutsBoard', 'Cuts board'],
	['lentUntil', 'Lent until'],
	['borrowedUntil', 'Borrowed until'],
	['price', 'Price'],
	['barcode', 'Barcode'],
	['arrives', 'On order until']
];

/** A field's value as it is read. */
export function fieldSays(value: SupplyForm[keyof SupplyForm]): string {
	if (typeof value === 'boolean') return value ? 'Yes' : 'No';
	return String(value) || '—';
}
