/** Why a pad was refused as a whole. */
export interface PadMessage {
	readonly text: string;
}
