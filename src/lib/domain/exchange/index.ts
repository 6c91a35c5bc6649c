export { billSchema, type BillDocument } from './bill-schema';
export {
	documentSchema,
	matchRequestSchema,
	type ExchangeDocument,
	type MatchRequestDocument,
	type MovementDocument
} from './document-schema';
export { readBill } from './read-bill';
export { readDocument, readMatchRequest, type Exchange, type MatchRequest } from './read-document';
export { writeChange, type Movement } from './read-movement';
export type { BareUnit } from './reading';
export { readSupply } from './read-supply';
export { supplySchema, type SupplyDocument } from './supply-schema';
export { Unreadable, type Issue } from './unreadable';
export { writeSupply } from './write-supply';
