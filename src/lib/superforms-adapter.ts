// Superforms' own barrel bundles an adapter for every validator; only zod's is wanted.
export {
	zod as zod4,
	zodClient as zod4Client
} from '../../node_modules/sveltekit-superforms/dist/adapters/zod4.js';
