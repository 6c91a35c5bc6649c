import { text } from '@sveltejs/kit';
import type { RequestHandler } from './$types';

/** The process answers. */
export const GET: RequestHandler = () => text('ok');
