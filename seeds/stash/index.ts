import { consumables } from './consumables';
import { hedgeSchool } from './hedge-school';
import { offcutsOf } from './offcuts';
import { saltLedger } from './salt-ledger';
import { smallPads } from './small-pads';
import { cardstock, otherSheets } from './stock';
import type { Row } from './row';
import { tools } from './tools';

/** Everything in the room, with its dates reckoned from today (YYYY-MM-DD). */
export function stash(today: string): Row[] {
	const papers = [...hedgeSchool, ...saltLedger, ...smallPads, ...cardstock(today), ...otherSheets(today)];
	return [...papers, ...offcutsOf(papers), ...consumables(today), ...tools(today)];
}
