import type { Bill } from './bill';
import { Proof, type Finding, type Units } from './proofreading/finding';
import { keyFindings, measureFindings } from './proofreading/keys';
import { markFindings } from './proofreading/marks';
import { mountFindings } from './proofreading/mounts';
import { punchFindings } from './proofreading/punches';
import { slotFindings } from './proofreading/slots';
import { stepFindings } from './proofreading/steps';
import { tapeFindings } from './proofreading/tape';
import { toolFindings } from './proofreading/tools';
import { wrapFindings } from './proofreading/wraps';

export type { Finding, Mend } from './proofreading/finding';

/** What doesn't add up in a bill, line by line, each with its figures and a mend. Figures are said in `units`. */
export function proofread(bill: Bill, units: Units = 'in'): Finding[] {
	const proof = new Proof(bill, units);
	return FAMILIES.flatMap((findings) => findings(proof));
}

const FAMILIES = [
	keyFindings,
	measureFindings,
	slotFindings,
	mountFindings,
	wrapFindings,
	markFindings,
	toolFindings,
	punchFindings,
	stepFindings,
	tapeFindings
];
