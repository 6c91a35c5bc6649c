import { liddedBox } from './lidded-box';
import { noteCards } from './note-cards';
import type { Starter } from './starter';
import { tagPocket } from './tag-pocket';

export type { Starter } from './starter';

export const STARTERS: readonly Starter[] = [noteCards, liddedBox, tagPocket];
