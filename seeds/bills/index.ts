import type { BillDocument } from '../../src/lib/domain/exchange/bill-schema';
import { accordion } from './accordion';
import { albumPage } from './album-page';
import { bookmarks } from './bookmarks';
import { envelopes } from './envelopes';
import { gatefolds } from './gatefolds';
import { giftBoxes } from './gift-boxes';
import { guestBooks } from './guest-books';
import { letterWallet } from './letter-wallet';
import { marketBags } from './market-bags';
import { matchboxChest } from './matchbox-chest';
import { notebooks } from './notebooks';
import { notelets } from './notelets';
import { parcelTags } from './parcel-tags';
import { pocketBook } from './pocket-book';
import { shakerCards } from './shaker-card';
import { tagBook } from './tag-book';

/** The room's projects in the order of its queue. */
export const bills: BillDocument[] = [
	tagBook,
	notelets,
	giftBoxes,
	accordion,
	matchboxChest,
	albumPage,
	gatefolds,
	letterWallet,
	bookmarks,
	envelopes,
	pocketBook,
	notebooks,
	shakerCards,
	marketBags,
	parcelTags,
	guestBooks
];
